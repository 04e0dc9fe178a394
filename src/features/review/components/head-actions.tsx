import { useState } from 'react';
import { ProblemNotice } from '../../../components/feedback/problem-notice';
import { Button, ButtonLink } from '../../../components/ui/button';
import { Menu, MenuItem, MenuLabel } from '../../../components/ui/menu';
import { useTakeApplication } from '../api/take-application';
import { countOpen, headSteps, type HeadStep, type StepName } from '../model/head-steps';
import {
  AcceptDialog,
  DeclineDialog,
  HandOverDialog,
  PutBackDialog,
  ReturnDialog,
  type StepDialogProps,
} from './step-dialogs';

interface HeadActionsProps extends Omit<StepDialogProps, 'onClose'> {
  /** The revision before the one shown, to compare with. */
  before: string | null;
}

const DIALOGS: Partial<Record<StepName, (props: StepDialogProps) => React.JSX.Element>> = {
  return: ReturnDialog,
  accept: AcceptDialog,
  decline: DeclineDialog,
  'hand-over': HandOverDialog,
  'put-back': PutBackDialog,
};

/** The steps of the case as buttons; the closed ones say what opens them. */
export function HeadActions({ before, ...props }: HeadActionsProps) {
  const { application, discrepancies, revision } = props;
  const [asking, setAsking] = useState<StepName | null>(null);
  const take = useTakeApplication(application.number);
  const { buttons, menu } = headSteps(application, countOpen(discrepancies));
  const run = (step: StepName) =>
    step === 'take' ? take.mutate({ body: { version: application.version } }) : setAsking(step);
  const Asked = asking === null ? undefined : DIALOGS[asking];
  return (
    <>
      {buttons.map((step) => (
        <Button
          key={step.step}
          kind={step.next ? 'primary' : 'secondary'}
          blockedBy={step.reason}
          busy={step.step === 'take' && take.isPending}
          onClick={() => run(step.step)}
        >
          {step.label}
        </Button>
      ))}
      {before !== null && (
        <ButtonLink to={`/applications/${application.number}/compare?from=${before}&to=${revision}`}>
          Compare with {before}
        </ButtonLink>
      )}
      {menu.length > 0 && <MoreSteps steps={menu} onChoose={run} />}
      <ProblemNotice error={take.error} />
      {Asked && <Asked {...props} onClose={() => setAsking(null)} />}
    </>
  );
}

/** Steps that are seldom taken. A closed one stays in the list with what opens it. */
function MoreSteps({ steps, onChoose }: { steps: readonly HeadStep[]; onChoose: (step: StepName) => void }) {
  const reasons = [...new Set(steps.flatMap((step) => (step.reason === null ? [] : [step.reason])))];
  return (
    <Menu align="start" trigger={<Button>More</Button>}>
      {steps.map((step) => (
        <MenuItem key={step.step} disabled={!step.open} onSelect={() => onChoose(step.step)}>
          {step.label}
        </MenuItem>
      ))}
      {reasons.map((reason) => (
        <MenuLabel key={reason}>{reason}</MenuLabel>
      ))}
    </Menu>
  );
}
