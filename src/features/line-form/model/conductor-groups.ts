import type { Conductor } from '#shared/contracts/api.generated';
import { familyOf } from './conductor-choice';

/** What a conductor is asked for. */
export type ConductorUse = 'phase' | 'ground';

/** Conductors that stand under one head of a list. */
export interface ConductorGroup {
  label: string;
  /** Shown, so that nobody looks in vain, but not to be chosen. */
  closed: boolean;
  items: Conductor[];
}

const isGroundWire = (conductor: Conductor): boolean => /shield|ground/i.test(familyOf(conductor));

function phaseGroups(conductors: readonly Conductor[]): ConductorGroup[] {
  const families = [...new Set(conductors.map(familyOf))];
  return families.map((family) => ({
    label: `Phase conductors: ${family}`,
    closed: false,
    items: conductors.filter((c) => familyOf(c) === family),
  }));
}

/**
 * The list of conductors as it is offered for a use: its own first, the others after them, and at the end,
 * closed, those whose data the models need and the library lacks. Retired ones only while they are chosen.
 */
export function offeredFor(
  use: ConductorUse,
  conductors: readonly Conductor[],
  current: string,
): ConductorGroup[] {
  const open = conductors.filter((c) => c.choosable || c.name === current);
  const grounds: ConductorGroup = { label: 'Ground wires', closed: false, items: open.filter(isGroundWire) };
  const phases = phaseGroups(open.filter((c) => !isGroundWire(c)));
  const lacking: ConductorGroup = {
    label: 'Data missing here: take “Own data sheet”',
    closed: true,
    items: conductors.filter((c) => !c.choosable && !c.retired && c.name !== current),
  };
  const groups = use === 'ground' ? [grounds, ...phases, lacking] : [...phases, grounds, lacking];
  return groups.filter((g) => g.items.length > 0);
}
