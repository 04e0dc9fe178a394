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
    ...lengthUnitSlips(context),
    ...inchSlips(context),
    ...bundleSlips(context, violated.has('x1') && keepsSpeed(context, BUNDLE_SPEED)),
    ...(keepsSpeed(context, POSITION_SPEED) ? positionSlips(context) : []),
    ...(violated.has('x1') && keepsSpeed(context, POSITION_SPEED) ? fittedPositions(context) : []),
  ];
}

/**
 * Most that another bundle, or one phase in another place, changes X1·B1 by: X1 and 1/B1 move together, save where a
 * misplaced phase comes close to another one.
 */
const BUNDLE_SPEED = 0.08;
const POSITION_SPEED = 0.3;

/** True when X1·B1 of every circuit is what its geometry gives, as it stays when phases or bundles move. */
function keepsSpeed({ base, declared }: VariantContext, most: number): boolean {
  return declared.every((values, circuit) => {
    const { x1, b1 } = base.circuits[circuit] ?? {};
    if (values?.x1 === undefined || values.b1 === undefined || x1 === undefined || b1 === undefined)
      return true;
    return Math.abs((values.x1 * values.b1) / (x1 * b1) - 1) < most;
  });
}

/** The slips in the filed geometry alone, those that are fitted left out. */
export function geometryVariants(context: VariantContext): Variant[] {
  return [
    ...bundleSlips(context, true),
    ...lengthUnitSlips(context),
    ...inchSlips(context),
    ...positionSlips(context),
  ];
}
