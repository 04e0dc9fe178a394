import { describe, expect, it } from 'vitest';
import { readFiling, readLine } from '#shared/filing/read-filing';
import { changed, CONTEXT, example, EXAMPLE_TEXT, faultsOf, onlyLine, readText } from './sample';

describe('the format’s own example', () => {
  it('is read without a fault, as it stands', () => {
    const read = readText(EXAMPLE_TEXT);
    expect(read.ok).toBe(true);
    const line = read.ok ? read.filing.lines[0] : undefined;
    expect(line).toMatchObject({
      pointer: '/lines/0',
      name: 'Harrow Fell – Sarn',
      nominalVoltageKv: 345,
      frequencyHz: 60,
      transposed: true,
      lengthKm: 42.5,
      cableShare: 0,
      circuitCount: 1,
    });
    expect(line?.sections.map((s) => s.kind)).toEqual(['overhead']);
    expect(line?.circuits[0]).toMatchObject({
      circuit: 1,
      pointer: '/lines/0/declared/0',
      ratingA: 1800,
      maxTemperatureC: 75,
      basis: { kind: 'calculated', status: 'design' },
    });
  });

  it('gives the engine every position in the filing’s order', () => {
    const { line } = onlyLine(example());
    const [section] = line.engineInput?.sections ?? [];
    const positions = section?.kind === 'overhead' ? section.positions : [];
    expect(positions.map((p) => (p.kind === 'phase' ? p.phase : 'g'))).toEqual(['a', 'b', 'c', 'g', 'g']);
    expect(positions[0]).toMatchObject({
      kind: 'phase',
      circuit: 1,
      horizontalM: -9,
      attachmentHeightM: 24,
      sagM: 9,
      bundleCount: 2,
      bundleSpacingM: 0.4572,
      conductor: { model: 'handbook', diameterMm: 28.14, gmrMm: 11.37, acResistanceOhmPerKm: 0.0798 },
    });
    expect(positions[3]).toMatchObject({ kind: 'ground-wire', conductor: { diameterMm: 9.14 } });
  });
});

describe('defaults', () => {
  const bare = () =>
    changed((line) => {
      delete line['transposed'];
      const [section] = line['sections'];
      delete section.kind;
      delete section.earthResistivityOhmM;
      delete section.groundWireBonding;
      for (const p of section.positions) {
        delete p.sagM;
        delete p.bundleCount;
        delete p.bundleSpacingM;
      }
    });

  it('are filled in, and the owner’s earth resistivity is told', () => {
    const { line, notices } = onlyLine(bare());
    expect(line.transposed).toBe(true);
    expect(line.sections[0]).toMatchObject({
      kind: 'overhead',
      resistivityIsOwners: true,
      input: { earthResistivityOhmM: 100, groundWireBonding: 'continuous' },
    });
    const input = line.sections[0]?.kind === 'overhead' ? line.sections[0].input : undefined;
    expect(input?.positions[0]).toMatchObject({ sagM: 0, bundleCount: 1, bundleSpacingM: 0 });
    expect(notices.map((n) => [n.code, n.pointer])).toEqual([
      ['earth-resistivity-default', '/lines/0/sections/0/earthResistivityOhmM'],
    ]);
    expect(line.sheet.line.sections[0]?.conductors?.['phase']?.temperatureCoefficientPerK).toBe(0.00403);
  });

  it('leave nothing to tell where the resistivity is given', () => {
    const { line, notices } = onlyLine(example());
    expect(notices).toEqual([]);
    expect(line.sections[0]).toMatchObject({ resistivityIsOwners: false });
  });

  it('may leave out the format', () => {
    const { format: _format, ...rest } = example();
    expect(faultsOf(rest)).toEqual([]);
  });

  it('survive freezing: a sheet read again is the same line, its assumptions and digits included', () => {
    const { line } = onlyLine(bare());
    const { sheet, pointer } = line;
    const again = readLine(sheet.line, {
      ...CONTEXT,
      owner: { baseMva: 1, earthResistivityOhmM: 7 },
      ...sheet,
      pointer,
    });
    expect(again.ok && again.line).toEqual(line);
  });
});

describe('a filing that is not one', () => {
  it.each([
    [null, ''],
    [42, ''],
    ['text', ''],
    [[], ''],
    [{}, '/lines'],
    [{ lines: 1 }, '/lines'],
    [{ lines: [] }, '/lines'],
  ])('%j is refused at "%s"', (json, pointer) => {
    const read = readFiling(json, CONTEXT);
    expect(!read.ok && read.faults.map((f) => f.pointer)).toEqual([pointer]);
  });

  it('tells an unknown version and an unknown key beside the faults of the lines', () => {
    const json = { ...changed((l) => delete l['from']), format: 'filing/9', comment: 'x' };
    expect(faultsOf(json)).toEqual([
      '/comment: “comment” is not a field that is known here.',
      '/format: Format must be “filing/1”; “filing/9” is there.',
      '/lines/0/from: From is missing.',
    ]);
  });

  it('names all faults of all lines, and gives the sound ones', () => {
    const one = changed((l) => (l['frequencyHz'] = 55)).lines[0];
    const two = changed((l) => (l['name'] = 'Sound')).lines[0];
    const three = changed((l) => {
      l['name'] = 'Third';
      l['nominalVoltageKv'] = '345';
    }).lines[0];
    const read = readFiling({ lines: [one, two, three] }, CONTEXT);
    expect(!read.ok && read.faults.map((f) => f.pointer)).toEqual([
      '/lines/0/frequencyHz',
      '/lines/2/nominalVoltageKv',
    ]);
    expect(!read.ok && read.sound.lines.map((l) => l.name)).toEqual(['Sound']);
  });

  it('refuses two lines of one name, also in other case or Unicode form', () => {
    const named = (name: string) => changed((l) => (l['name'] = name)).lines[0];
    const twice = (a: string, b: string) => faultsOf({ lines: [named(a), named(b)] });
    expect(twice('North', 'North')).toEqual(['/lines/1/name: Lines 1 and 2 have the same name: “North”.']);
    expect(twice('Ångfall', 'A\u030Angfall')).toHaveLength(1);
    expect(twice('North', 'NORTH')).toHaveLength(1);
    expect(twice('North 1', 'North 2')).toEqual([]);
  });
});

describe('figures of a declared value', () => {
  const declare = (entry: object) => changed((l) => Object.assign(l['declared'][0], entry));

  it('per length: SI, the total over the length, half a unit of the last digit', () => {
    const read = readText(
      EXAMPLE_TEXT.replace('"value": 0.6135, "unit": "ohm/km"', '"value": 0.370, "unit": "ohm/mi"'),
    );
    const x1 = read.ok ? read.filing.lines[0]?.circuits[0]?.declared.x1 : undefined;
    expect(x1).toMatchObject({ value: 0.37, unit: 'ohm/mi', form: 'per-length', written: '0.370' });
    expect(x1?.pointer).toBe('/lines/0/declared/0/x1');
    expect(x1?.perKm).toBeCloseTo(0.37 / 1.609344, 14);
    expect(x1?.total).toBeCloseTo((0.37 / 1.609344) * 42.5, 12);
    expect(x1?.halfDigitPerKm).toBeCloseTo(0.0005 / 1.609344, 14);
    expect(x1).not.toHaveProperty('baseMva');
  });

  it('of the whole line: the total, and per length by the line’s length', () => {
    const { line } = onlyLine(declare({ x1: { value: 16.2, unit: 'ohm' } }));
    const x1 = line.circuits[0]?.declared.x1;
    expect(x1).toMatchObject({ form: 'whole-line', total: 16.2 });
    expect(x1?.perKm).toBeCloseTo(16.2 / 42.5, 14);
    expect(x1?.halfDigitPerKm).toBeCloseTo(0.05 / 42.5, 14);
  });

  it('in pu: on the base beside it, else the owner’s MVA and the nominal voltage, which is told', () => {
    const own = onlyLine(declare({ x1: { value: 0.0136, unit: 'pu', baseMva: 50, baseKv: 330 } }));
    expect(own.line.circuits[0]?.declared.x1).toMatchObject({ baseMva: 50, baseKv: 330 });
    expect(own.line.circuits[0]?.declared.x1?.total).toBeCloseTo((0.0136 * 330 * 330) / 50, 10);
    expect(own.notices).toEqual([]);
    const owners = onlyLine(declare({ x1: { value: 1.36, unit: '%' } }));
    expect(owners.line.circuits[0]?.declared.x1).toMatchObject({ baseMva: 100, baseKv: 345 });
    expect(owners.line.circuits[0]?.declared.x1?.total).toBeCloseTo((0.0136 * 345 * 345) / 100, 10);
    expect(owners.notices.map((n) => [n.code, n.pointer])).toEqual([
      ['base-default', '/lines/0/declared/0/x1'],
    ]);
  });

  it('takes any finite number: sign and size are findings', () => {
    expect(
      faultsOf(declare({ x1: { value: -4000, unit: 'ohm/km' }, b1: { value: 0, unit: 'uS/km' } })),
    ).toEqual([]);
    expect(faultsOf(declare({ r1: { value: 1e90, unit: 'ohm/km' } }))).toEqual([]);
  });

  it('refuses what overflows in SI, at the value', () => {
    const [fault] = faultsOf(declare({ x1: { value: 1e308, unit: 'ohm/kft' } }));
    expect(fault).toMatch(/^\/lines\/0\/declared\/0\/x1\/value: /);
  });
});

describe('measures', () => {
  it('takes a whole structure in centimetres: the check names that slip, the schema does not stop it', () => {
    const { line } = onlyLine(
      changed((l) => {
        for (const p of l['sections'][0].positions) {
          for (const field of ['horizontalM', 'attachmentHeightM', 'sagM', 'bundleSpacingM'])
            if (p[field] !== undefined) p[field] *= 100;
        }
        l['sections'][0].positions[0].horizontalM = -1850;
      }),
    );
    const [section] = line.engineInput?.sections ?? [];
    expect(section?.kind === 'overhead' && section.positions[0]?.horizontalM).toBe(-1850);
  });

  it('refuses a structure wider or higher than any mistaken unit makes it', () => {
    const faults = faultsOf(
      changed((l) => {
        l['sections'][0].positions[0].horizontalM = -10001;
        l['sections'][0].positions[1].attachmentHeightM = 10001;
      }),
    );
    expect(faults).toHaveLength(2);
    expect(faults[0]).toMatch(/positions\/0\/horizontalM: Offset must be at least −10.000.m/u);
  });
});

describe('sections', () => {
  it('may come without conductors and positions, together', () => {
    const { line } = onlyLine(
      changed((l) => {
        delete l['sections'][0].conductors;
        delete l['sections'][0].positions;
      }),
    );
    expect(line.sections[0]).toMatchObject({
      kind: 'geometry-missing',
      lengthKm: 42.5,
      earthResistivityOhmM: 100,
    });
    expect(line.engineInput).toBeNull();
    expect(line.circuitCount).toBe(1);
  });

  it('of cable are taken as declared, in their units, for each circuit', () => {
    const value = (v: number, unit: string) => ({ value: v, unit });
    const perLength = {
      r1: value(0.03, 'ohm/km'),
      x1: value(0.4, 'mH/km'),
      b1: value(200, 'nF/km'),
      r0: value(0.3, 'ohm/km'),
      x0: value(1.2, 'ohm'),
      b0: value(60, 'uS/km'),
    };
    const { line } = onlyLine(
      changed((l) => l['sections'].push({ kind: 'cable', lengthKm: 7.5, perLength })),
    );
    expect(line.lengthKm).toBe(50);
    expect(line.cableShare).toBeCloseTo(0.15, 14);
    const cable = line.sections[1];
    const [values] = cable?.kind === 'cable' ? cable.input.perLength : [];
    expect(values?.r1).toBe(0.03);
    expect(values?.x1).toBeCloseTo(2 * Math.PI * 60 * 0.4e-3, 14);
    expect(values?.b1).toBeCloseTo(2 * Math.PI * 60 * 200e-9 * 1e6, 10);
    // A unit of the whole length is for the section’s 7.5 km.
    expect(values?.x0).toBeCloseTo(1.2 / 7.5, 14);
    expect(line.engineInput?.sections).toHaveLength(2);
  });

  it('of two circuits carry a declared coupling', () => {
    const { line } = onlyLine(
      changed((l) => {
        const second = l['sections'][0].positions
          .filter((p: { groundWire?: boolean }) => !p.groundWire)
          .map((p: object) => ({ ...p, circuit: 2, attachmentHeightM: 40 }));
        l['sections'][0].positions.push(...second);
        l['declaredMutual'] = [
          { circuits: [2, 1], x0m: { value: 0.69, unit: 'ohm/km' }, b0m: { value: -0.67, unit: 'uS/km' } },
        ];
      }),
    );
    expect(line.circuitCount).toBe(2);
    expect(line.circuits).toHaveLength(1);
    expect(line.mutual[0]).toMatchObject({
      circuits: [1, 2],
      declared: { x0m: { perKm: 0.69 }, b0m: { perKm: -0.67, pointer: '/lines/0/declaredMutual/0/b0m' } },
    });
  });
});
