import type { Line } from './sample';

const section = (l: Line) => l['sections'][0];
const at = '/lines/0/sections/0';

/** Each row breaks one thing of the example; the fault stands where it is to be mended and says what is wanted. */
export const BREAKS: [name: string, change: (l: Line) => void, pointer: string, words: RegExp][] = [
  [
    'text for a number',
    (l) => (l['nominalVoltageKv'] = '345'),
    '/lines/0/nominalVoltageKv',
    /must be a number; “345” is there\. Leave out the quotes/,
  ],
  ['null for a number', (l) => (section(l).lengthKm = null), `${at}/lengthKm`, /nothing is there/],
  [
    'a frequency of neither system',
    (l) => (l['frequencyHz'] = 55),
    '/lines/0/frequencyHz',
    /must be one of 50, 60/,
  ],
  ['a length of nought', (l) => (section(l).lengthKm = 0), `${at}/lengthKm`, /more than 0.km; 0 is there/],
  ['a length below nought', (l) => (section(l).lengthKm = -4), `${at}/lengthKm`, /−4 is there/],
  [
    'a height below nought',
    (l) => (section(l).positions[0].attachmentHeightM = -24),
    `${at}/positions/0/attachmentHeightM`,
    /more than 0.m/,
  ],
  [
    'a diameter of nought',
    (l) => (section(l).conductors.phase.diameterMm = 0),
    `${at}/conductors/phase/diameterMm`,
    /more than 0.mm/,
  ],
  [
    'a resistivity of nought',
    (l) => (section(l).earthResistivityOhmM = 0),
    `${at}/earthResistivityOhmM`,
    /more than 0/,
  ],
  [
    'a voltage in volts',
    (l) => (l['nominalVoltageKv'] = 345000),
    '/lines/0/nominalVoltageKv',
    /at most 2.000.kV; 345.000 is there/,
  ],
  [
    'nine subconductors',
    (l) => (section(l).positions[1].bundleCount = 9),
    `${at}/positions/1/bundleCount`,
    /at most 8/,
  ],
  [
    'half a subconductor',
    (l) => (section(l).positions[1].bundleCount = 1.5),
    `${at}/positions/1/bundleCount`,
    /a whole number/,
  ],
  [
    'a bundle without spacing',
    (l) => delete section(l).positions[2].bundleSpacingM,
    `${at}/positions/2/bundleSpacingM`,
    /Bundle spacing is missing\. Give it in.m\./,
  ],
  [
    'a bundle of nought',
    (l) => (section(l).positions[2].bundleSpacingM = 0),
    `${at}/positions/2/bundleSpacingM`,
    /more than 0/,
  ],
  [
    'an unknown unit',
    (l) => (l['declared'][0].x1.unit = 'ohms/km'),
    '/lines/0/declared/0/x1/unit',
    /Did you mean ohm\/km/,
  ],
  [
    'a unit of reactance for a resistance',
    (l) => (l['declared'][0].r1.unit = 'mH/km'),
    '/lines/0/declared/0/r1/unit',
    /must be one of ohm\/km/,
  ],
  [
    'a unit in other case',
    (l) => (l['declared'][0].b1.unit = 'us/km'),
    '/lines/0/declared/0/b1/unit',
    /Did you mean uS\/km/,
  ],
  [
    'a bare number for a declared value',
    (l) => (l['declared'][0].x1 = 0.38),
    '/lines/0/declared/0/x1',
    /must be an object/,
  ],
  ['a missing X1', (l) => delete l['declared'][0].x1, '/lines/0/declared/0/x1', /X1 is missing/],
  ['nothing declared', (l) => (l['declared'] = []), '/lines/0/declared', /at least 1 entry\./],
  [
    'a conductor that the section has not, far from any name',
    (l) => (section(l).positions[1].conductor = 'x7'),
    `${at}/positions/1/conductor`,
    /no conductor “x7”\. It has phase, ground\./,
  ],
  ['a misspelt field', (l) => (section(l).lenghtKm = 1), `${at}/lenghtKm`, /Did you mean lengthKm/],
  ['a field of another object', (l) => (l['gmrMm'] = 1), '/lines/0/gmrMm', /not a field that is known here/],
  [
    'a phase that is none',
    (l) => (section(l).positions[0].phase = 'A'),
    `${at}/positions/0/phase`,
    /one of a, b, c/,
  ],
  [
    'a circuit number of nought',
    (l) => (section(l).positions[0].circuit = 0),
    `${at}/positions/0/circuit`,
    /at least 1/,
  ],
  [
    'a doubled phase',
    (l) => (section(l).positions[1].phase = 'a'),
    `${at}/positions/1/phase`,
    /phase a twice \(positions 1 and 2\)/,
  ],
  [
    'a missing phase',
    (l) => section(l).positions.splice(1, 1),
    `${at}/positions`,
    /Circuit 1 lacks phase b\./,
  ],
  ['ground wires only', (l) => section(l).positions.splice(0, 3), `${at}/positions`, /no phase/],
  [
    'circuit 2 without circuit 1',
    (l) => section(l).positions.forEach((p: Line) => p['groundWire'] || (p['circuit'] = 2)),
    `${at}/positions`,
    /numbered from 1/,
  ],
  [
    'a position on no conductor',
    (l) => (section(l).positions[3].conductor = 'grond'),
    `${at}/positions/3/conductor`,
    /Did you mean ground\?/,
  ],
  [
    'a ground wire with a phase',
    (l) => (section(l).positions[4].phase = 'a'),
    `${at}/positions/4/phase`,
    /A ground wire has no phase/,
  ],
  [
    'groundWire that is not true',
    (l) => (section(l).positions[4].groundWire = false),
    `${at}/positions/4/groundWire`,
    /must be true/,
  ],
  [
    'an unknown conductor',
    (l) => (section(l).conductors.phase = { library: 'Darke', temperatureC: 50 }),
    `${at}/conductors/phase/library`,
    /no conductor “Darke”\. The nearest is Drake\./,
  ],
  [
    'a library row that lacks data',
    (l) => (section(l).conductors.phase = { library: 'Teal', temperatureC: 50 }),
    `${at}/conductors/phase/library`,
    /lacks an a\.c\. resistance/,
  ],
  [
    'a library conductor without temperature',
    (l) => (section(l).conductors.phase = { library: 'Drake' }),
    `${at}/conductors/phase/temperatureC`,
    /Temperature is missing/,
  ],
  [
    'a library conductor with data beside it',
    (l) => (section(l).conductors.phase = { library: 'Drake', temperatureC: 50, gmrMm: 11 }),
    `${at}/conductors/phase/gmrMm`,
    /brings its own data/,
  ],
  [
    'handbook data without GMR',
    (l) => delete section(l).conductors.phase.gmrMm,
    `${at}/conductors/phase/gmrMm`,
    /GMR is missing\. Give it in.mm\./,
  ],
  [
    'a tube without d.c. resistance',
    (l) => (section(l).conductors.ground = { model: 'tube', diameterMm: 9, temperatureC: 20 }),
    `${at}/conductors/ground/dcResistance20OhmPerKm`,
    /is missing/,
  ],
  [
    'a tube without temperature',
    (l) => (section(l).conductors.ground = { model: 'tube', diameterMm: 9, dcResistance20OhmPerKm: 3 }),
    `${at}/conductors/ground/temperatureC`,
    /is missing/,
  ],
  [
    'a model that is none',
    (l) => (section(l).conductors.ground.model = 'wire'),
    `${at}/conductors/ground/model`,
    /one of handbook, tube/,
  ],
  [
    'positions without conductors',
    (l) => delete section(l).conductors,
    `${at}/conductors`,
    /together or not at all/,
  ],
  [
    'conductors without positions',
    (l) => delete section(l).positions,
    `${at}/positions`,
    /together or not at all/,
  ],
  [
    'a cable without values',
    (l) => l['sections'].push({ kind: 'cable', lengthKm: 1 }),
    '/lines/0/sections/1/perLength',
    /Cable values are missing/,
  ],
  [
    'a cable with positions',
    (l) => (section(l).kind = 'cable'),
    `${at}/positions`,
    /A cable section has no positions/,
  ],
  [
    'an overhead section with cable values',
    (l) => (section(l).perLength = {}),
    `${at}/perLength`,
    /An overhead section has no perLength/,
  ],
  [
    'a declared circuit that is not there',
    (l) => (l['declared'][0].circuit = 2),
    '/lines/0/declared/0/circuit',
    /carries circuit 1 only/,
  ],
  [
    'a circuit declared twice',
    (l) => l['declared'].push(structuredClone(l['declared'][0])),
    '/lines/0/declared/1/circuit',
    /declared twice/,
  ],
  [
    'a coupling with a circuit that is not there',
    (l) => (l['declaredMutual'] = [{ circuits: [1, 2], r0m: { value: 1, unit: 'ohm/km' } }]),
    '/lines/0/declaredMutual/0/circuits',
    /does not carry/,
  ],
  [
    'a coupling of a circuit with itself',
    (l) => (l['declaredMutual'] = [{ circuits: [1, 1], r0m: { value: 1, unit: 'ohm/km' } }]),
    '/lines/0/declaredMutual/0/circuits',
    /the same entry twice/,
  ],
  [
    'sections of different circuits',
    (l) => {
      const two = structuredClone(section(l));
      two.positions.push(
        ...two.positions.slice(0, 3).map((p: Line) => ({ ...p, circuit: 2, horizontalM: 40 })),
      );
      l['sections'].push(two);
    },
    '/lines/0/sections/1/positions',
    /A stretch with other circuits is a line of its own/,
  ],
  [
    'a day that does not exist',
    (l) => (l['declared'][0].basis.date = '2027-02-30'),
    '/lines/0/declared/0/basis/date',
    /a day that exists/,
  ],
  ['an empty name', (l) => (l['name'] = ''), '/lines/0/name', /Name is empty/],
  ['a name with NUL', (l) => (l['name'] = 'A\u0000B'), '/lines/0/name', /A\\u0000B/],
  [
    'a name that turns the writing direction',
    (l) => (l['name'] = 'A\u202EB'),
    '/lines/0/name',
    /not allowed/,
  ],
  ['a name with a lone surrogate', (l) => (l['name'] = 'A\uD800B'), '/lines/0/name', /not allowed/],
  ['a name with an invisible space', (l) => (l['name'] = 'A\u200B'), '/lines/0/name', /not allowed/],
  ['a name that ends with a space', (l) => (l['name'] = 'A '), '/lines/0/name', /ends with a space/],
  [
    'a name of 100 000 characters',
    (l) => (l['name'] = 'A'.repeat(100_000)),
    '/lines/0/name',
    /longer than 120/,
  ],
  [
    'a conductor key that is a prototype',
    (l) => (section(l).conductors.constructor = section(l).conductors.phase),
    `${at}/conductors/constructor`,
    /cannot be used/,
  ],
  [
    'a number that is not finite',
    (l) => (section(l).positions[0].horizontalM = Infinity),
    `${at}/positions/0/horizontalM`,
    /cannot be reckoned|can be reckoned/,
  ],
];

/** Slips that bring a second fault with them: a phase doubled is another one missing. */
