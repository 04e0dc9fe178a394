import { Fragment, type ReactNode } from 'react';
import type { Conductor, Position, Section } from '#shared/contracts/filing.generated';
import { figure, fixed, quantity, THIN_SPACE } from '#shared/format/numbers';

const mm = (value: number | undefined, places = 2) =>
  value === undefined ? 'not given' : `${fixed(value, places)}${THIN_SPACE}mm`;

/** The conductors of a section with what was filed of them, and the earth beneath. */
export function ConductorFacts({ section }: { section: Section }) {
  const positions = section.positions ?? [];
  const used = (wires: boolean) => [
    ...new Set(positions.filter((p) => Boolean(p.groundWire) === wires).map((p) => p.conductor)),
  ];
  const { conductors = {} } = section;
  const bonding = section.groundWireBonding === 'segmented' ? 'segmented' : 'grounded throughout';
  return (
    <>
      {used(false).map((key) => (
        <Facts key={key} title="Phases">
          <PhaseFacts conductor={conductors[key]} of={positions.find((p) => p.conductor === key)} />
        </Facts>
      ))}
      {used(true).map((key) => {
        const count = positions.filter((p) => p.groundWire && p.conductor === key).length;
        return (
          <Facts key={key} title="Ground wires">
            <Fact label="Wire">{`${count} × ${conductors[key]?.name ?? key}, ${bonding}`}</Fact>
            <WireFacts conductor={conductors[key]} />
          </Facts>
        );
      })}
      <Facts title="Earth">
        <Fact label="Resistivity">
          {section.earthResistivityOhmM === undefined
            ? 'the owner’s'
            : `${figure(section.earthResistivityOhmM, 4).replace(/\.0+$/, '')}${THIN_SPACE}Ω${THIN_SPACE}m`}
        </Fact>
      </Facts>
    </>
  );
}

function Facts({ title, children }: { title: string; children: ReactNode }) {
  return (
    <div>
      <h3 className="mb-0.5 text-table leading-[18px]">{title}</h3>
      <dl className="facts">{children}</dl>
    </div>
  );
}

function Fact({ label, children }: { label: string; children: ReactNode }) {
  return (
    <Fragment>
      <dt>{label}</dt>
      <dd>{children}</dd>
    </Fragment>
  );
}

function PhaseFacts({ conductor, of }: { conductor: Conductor | undefined; of: Position | undefined }) {
  const count = of?.bundleCount ?? 1;
  const name = conductor?.name ?? of?.conductor ?? '';
  const apart = count > 1 ? `, ${fixed((of?.bundleSpacingM ?? 0) * 1000, 0)}${THIN_SPACE}mm apart` : '';
  return (
    <>
      <Fact label="Conductor">{count > 1 ? `${count} × ${name}${apart}` : name}</Fact>
      <WireFacts conductor={conductor} />
    </>
  );
}

function WireFacts({ conductor }: { conductor: Conductor | undefined }) {
  if (!conductor) return null;
  const { acResistanceOhmPerKm, dcResistance20OhmPerKm, temperatureC } = conductor;
  const at = temperatureC === undefined ? '' : ` at ${temperatureC}${THIN_SPACE}°C`;
  return (
    <>
      <Fact label={conductor.gmrMm === undefined ? 'Diameter, core' : 'Diameter, GMR'}>
        {mm(conductor.diameterMm)}, {mm(conductor.gmrMm ?? conductor.coreDiameterMm)}
      </Fact>
      {acResistanceOhmPerKm !== undefined && (
        <Fact label={`Resistance${at}`}>{quantity(acResistanceOhmPerKm, 'Ω/km', 3)}</Fact>
      )}
      {dcResistance20OhmPerKm !== undefined && (
        <Fact label={`D.c. resistance at 20${THIN_SPACE}°C`}>
          {quantity(dcResistance20OhmPerKm, 'Ω/km', 3)}
        </Fact>
      )}
    </>
  );
}
