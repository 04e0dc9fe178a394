import { bundleSlips } from './bundle-slips';
import { conductorSlips, resistanceSlips } from './conductor-slips';
import { earthSlips } from './earth-slips';
import {
  arithmeticSpacingSlip,
  frequencySlip,
  groundWireSlips,
  longLineSlips,
  misplacedSlips,
  towerHeightSlip,
} from './line-slips';
import { otherConductorSlips } from './other-conductor';
import { fittedPositions, positionSlips } from './position-slips';
import { inchSlips, lengthUnitSlips } from './unit-of-geometry';
import type { Variant, VariantContext } from './variant';

/**
 * Every variant of a line that may explain its declared values.
 *
 * @param context the line and what it gives as filed
 * @param violated the constants that are beyond tolerance on any circuit or pair
 */
export function allVariants(context: VariantContext, violated: ReadonlySet<string>): Variant[] {
  return [
    ...frequencySlip(context),
    ...longLineSlips(context),
    ...misplacedSlips(context),
    ...resistanceSlips(context),
    ...conductorSlips(context),
    ...arithmeticSpacingSlip(context),
    ...groundWireSlips(context),
    ...towerHeightSlip(context),
    ...earthSlips(context, violated),
    ...otherConductorSlips(context),
    ...geometryVariants(context),
    ...(violated.has('x1') ? fittedPositions(context) : []),
  ];
}

/** The slips in the filed geometry alone, those that are fitted left out. */
export function geometryVariants(context: VariantContext): Variant[] {
  return [
    ...bundleSlips(context),
    ...lengthUnitSlips(context),
    ...inchSlips(context),
    ...positionSlips(context),
  ];
}
