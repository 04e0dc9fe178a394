/**
 * Asks mathjs once for the factor of every unit of the closed list, so that server and client convert by the
 * same numbers and the client carries no unit library. mathjs never sees what a user wrote: the list is here.
 */

/** Unit as the product spells it → [one such unit as mathjs reads it, SI unit of the product]. */
const UNITS = {
  perLengthImpedance: {
    'ohm/km': ['ohm/km', 'ohm/km'],
    'ohm/mi': ['ohm/mi', 'ohm/km'],
    'ohm/kft': ['0.001 ohm/ft', 'ohm/km'],
  },
  perLengthInductance: { 'mH/km': ['mH/km', 'H/km'], 'mH/mi': ['mH/mi', 'H/km'] },
  perLengthSusceptance: { 'uS/km': ['uS/km', 'uS/km'], 'uS/mi': ['uS/mi', 'uS/km'] },
  perLengthCapacitance: {
    'nF/km': ['nF/km', 'F/km'],
    'nF/mi': ['nF/mi', 'F/km'],
    'uF/km': ['uF/km', 'F/km'],
  },
  length: {
    km: ['km', 'm'],
    m: ['m', 'm'],
    cm: ['cm', 'm'],
    mm: ['mm', 'm'],
    mi: ['mi', 'm'],
    ft: ['ft', 'm'],
    in: ['in', 'm'],
  },
  area: { mm2: ['mm^2', 'mm^2'] },
};

/** The text of shared/units/factors.generated.ts. */
export async function factorsText() {
  const { create, all } = await import('mathjs');
  const math = create(all);
  const factor = ([from, to]) => {
    const one = math.unit(/^\d/.test(from) ? from : `1 ${from}`).toNumber(to);
    // 15 digits are what a double holds of a ratio that was reached by several products.
    return Number(one.toPrecision(15));
  };
  const groups = Object.entries(UNITS).map(([group, units]) => {
    const rows = Object.entries(units).map(([name, pair]) => `'${name}': ${factor(pair)},`);
    if (group === 'area')
      rows.push(
        `kcmil: ${Number((math.unit('1000 mil^2').toNumber('mm^2') * (Math.PI / 4)).toPrecision(15))},`,
      );
    const to = Object.values(units)[0][1];
    return `/** Into ${to}. */\n${group}: {\n${rows.join('\n')}\n},`;
  });
  return `/** Factors of the closed list of units, by mathjs. Made by \`npm run generate\`; do not edit. */\nexport const FACTORS = {\n${groups.join('\n')}\n} as const;\n`;
}
