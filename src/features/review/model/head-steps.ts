import type { Application, Discrepancy } from '#shared/contracts/api.generated';

type Step = Application['steps'][number];
export type StepName = Step['step'];

/** A step as a button of the page's head. */
export interface HeadStep {
  step: StepName;
  label: string;
  /** The one that the case asks for next. */
  next: boolean;
  open: boolean;
  /** What opens it, as a sentence; null while it is open. */
  reason: string | null;
}

/** The order of the buttons; all others stand in the menu beside them. */
const BUTTONS: readonly StepName[] = ['take', 'return', 'accept'];
const MENU: readonly StepName[] = ['decline', 'hand-over', 'put-back'];

const LABELS: Partial<Record<StepName, string>> = {
  take: 'Take',
  return: 'Return',
  accept: 'Accept',
  decline: 'Decline',
  'hand-over': 'Hand over',
  'put-back': 'Put back into the queue',
};

/** "Return with 2 discrepancies". */
export function returnLabel(open: number): string {
  if (open === 0) return 'Return';
  return `Return with ${open} ${open === 1 ? 'discrepancy' : 'discrepancies'}`;
}

/** Steps that end a state: they make no sense as buttons where the state is not the one they begin in. */
const STATE_OF: Partial<Record<StepName, Application['state']>> = {
  take: 'filed',
  return: 'in-review',
  accept: 'in-review',
  decline: 'in-review',
  'hand-over': 'in-review',
  'put-back': 'in-review',
};

function headStep(found: Step, next: StepName | null, open: number): HeadStep {
  return {
    step: found.step,
    label: found.step === 'return' ? returnLabel(open) : (LABELS[found.step] ?? found.step),
    next: found.step === next,
    open: found.open,
    reason: found.open ? null : found.reason,
  };
}

/** Open and answered discrepancies: what a letter would take along. */
export function countOpen(discrepancies: readonly Pick<Discrepancy, 'state'>[]): number {
  return discrepancies.filter((d) => d.state === 'open').length;
}

/**
 * The buttons and the menu of a case for whoever reads it. Steps of another state are left out; a step that is closed
 * for another reason stays, with what opens it.
 */
export function headSteps(
  { state, steps }: Pick<Application, 'state' | 'steps'>,
  open: number,
): { buttons: HeadStep[]; menu: HeadStep[] } {
  const here = steps.filter((s) => STATE_OF[s.step] === state);
  const next = (['take', 'accept', 'return'] as const).find((name) =>
    here.some((s) => s.step === name && s.open),
  );
  const pick = (names: readonly StepName[]) =>
    names.flatMap((name) => {
      const found = here.find((s) => s.step === name);
      return found ? [headStep(found, next ?? null, open)] : [];
    });
  return { buttons: pick(BUTTONS), menu: pick(MENU) };
}

/** Whether a step may be taken now. */
export function isOpen({ steps }: Pick<Application, 'steps'>, step: StepName): boolean {
  return steps.some((s) => s.step === step && s.open);
}
