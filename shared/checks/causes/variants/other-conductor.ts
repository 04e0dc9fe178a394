import { conductorResistanceOhmPerKm } from '../../../engine/index';
import type { ConductorData } from '../../../engine/index';
import { handbookData } from '../../../library/handbook-data';
import type { LibraryConductor } from '../../../library/types';
import { TIGHT } from '../problem';
import { gmrOf } from './gmr-of';
import type { Variant, VariantContext } from './variant';
import { ENGINE_MODEL, changeConductors, overheadSections } from './variant';

/** Temperature taken where the filed conductor names none, °C. */
const USUAL_C = 50;

/** Room that the quick look leaves beyond the tight tolerance, for what it leaves out. */
const QUICK_LOOK = TIGHT + 0.012;

/** The declared values worked out with another conductor of the library. */
export function otherConductorSlips(context: VariantContext): Variant[] {
  const filed = filedConductor(context);
  if (filed === null) return [];
  const likely = context.library.flatMap((row) => {
    const data = handbookData(row, filed.conductor.temperatureC ?? USUAL_C);
    return data !== null && data.name !== filed.conductor.name && couldFit(context, filed, data)
      ? [data]
      : [];
  });
  const prior = -0.7 - Math.log(Math.max(2, context.library.length));
  return likely.flatMap((data): Variant[] => {
    const outcome = context.bench.changed(changeConductors(() => data));
    const words = `the conductor was taken as ${data.name}`;
    const common = { code: 'other-conductor', in: 'declared', model: ENGINE_MODEL, freedom: 0 } as const;
    return outcome === null ? [] : [{ ...common, outcome, prior, words }];
  });
}

interface Filed {
  conductor: ConductorData;
  bundleCount: number;
}

/** The one phase conductor of the line; null when sections or phases differ. */
function filedConductor(context: VariantContext): Filed | null {
  let found: Filed | null = null;
  for (const { section } of overheadSections(context)) {
    for (const position of section.positions) {
      if (position.kind !== 'phase') continue;
      const { conductor, bundleCount } = position;
      if (found === null) found = { conductor, bundleCount };
      else if (!isSame(found, { conductor, bundleCount })) return null;
    }
  }
  return found;
}

function isSame(one: Filed, other: Filed): boolean {
  return (
    one.bundleCount === other.bundleCount &&
    one.conductor.diameterMm === other.conductor.diameterMm &&
    gmrOf(one.conductor) === gmrOf(other.conductor) &&
    one.conductor.acResistanceOhmPerKm === other.conductor.acResistanceOhmPerKm &&
    one.conductor.dcResistance20OhmPerKm === other.conductor.dcResistance20OhmPerKm
  );
}

/** A quick look by the change of each subconductor's own impedance, before the engine is asked. */
function couldFit(
  context: VariantContext,
  filed: Filed,
  data: Pick<LibraryConductor, 'gmrMm'> & { acResistanceOhmPerKm: number },
): boolean {
  const { gmrMm } = data;
  if (gmrMm === undefined) return false;
  const omega = 2 * Math.PI * context.bench.line.frequencyHz;
  const shift = (omega * 2e-4 * Math.log(gmrOf(filed.conductor) / gmrMm)) / filed.bundleCount;
  return context.base.circuits.some((values, circuit) => {
    const declared = context.declared[circuit];
    const { r1, x1 } = values;
    if (declared?.x1 === undefined || x1 === undefined || declared.r1 === undefined || r1 === undefined)
      return false;
    const { acResistanceOhmPerKm, temperatureC } = filed.conductor;
    const own =
      acResistanceOhmPerKm ??
      conductorResistanceOhmPerKm(filed.conductor, temperatureC ?? USUAL_C, context.bench.line.frequencyHz);
    const resistance = r1 + (data.acResistanceOhmPerKm - own) / filed.bundleCount;
    return (
      Math.abs((declared.x1 - x1 - shift) / x1) < QUICK_LOOK &&
      Math.abs(declared.r1 / resistance - 1) < QUICK_LOOK + 0.03
    );
  });
}
