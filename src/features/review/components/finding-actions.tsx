import { useState } from 'react';
import type { Finding } from '#shared/contracts/api.generated';
import { WordsDialog } from '../../../components/feedback/words-dialog';
import { Button } from '../../../components/ui/button';
import { Menu, MenuItem } from '../../../components/ui/menu';
import { useSetAsideFinding } from '../api/set-aside-finding';
import { useWaiveFinding } from '../api/waive-finding';
import type { Selection } from '../hooks/use-selection';

interface FindingActionsProps {
  number: string;
  revision: string;
  finding: Finding;
  selection: Selection;
  /** Raising, waiving and setting aside are open to whoever reads the page. */
  mayAct: boolean;
  /** "D-3": the number of the next discrepancy. */
  nextName: string;
  onRaise: (findings: readonly Finding[]) => void;
}

/**
 * What a reviewer can do with a finding, beside its words. A dialog once opened stays, also when the finding is read
 * again meanwhile and nothing can be done with it any more: the server then says why, and no words are lost.
 */
export function FindingActions(props: FindingActionsProps) {
  const [asking, setAsking] = useState<'waive' | 'set-aside' | null>(null);
  const close = () => setAsking(null);
  return (
    <>
      <FindingButtons {...props} onAsk={setAsking} />
      {asking === 'waive' && <WaiveDialog {...props} onClose={close} />}
      {asking === 'set-aside' && <SetAsideDialog {...props} onClose={close} />}
    </>
  );
}

interface FindingButtonsProps extends FindingActionsProps {
  onAsk: (what: 'waive' | 'set-aside') => void;
}

function FindingButtons({ finding, selection, mayAct, nextName, onRaise, onAsk }: FindingButtonsProps) {
  if (finding.discrepancy !== null) {
    return (
      <a className="button button-small" href={`#d-${finding.discrepancy}`}>
        {`Open in D-${finding.discrepancy}`}
      </a>
    );
  }
  if (!mayAct || !finding.stands || finding.follows !== null || finding.disposition !== null) return null;
  const chosen = selection.has(finding);
  const others = selection.findings.length - (chosen ? 1 : 0);
  return (
    <>
      <Button small onClick={() => onRaise(chosen ? selection.findings : [...selection.findings, finding])}>
        {others > 0 ? `Raise with ${others} more as ${nextName}` : `Raise as ${nextName}`}
      </Button>
      <Menu
        trigger={
          <Button small aria-label={`More about: ${finding.message}`}>
            More
          </Button>
        }
      >
        <MenuItem onSelect={() => selection.toggle(finding)}>
          {chosen ? 'Take out of the choice' : 'Choose, to raise with others'}
        </MenuItem>
        {finding.grade !== 'must-answer' && (
          <MenuItem onSelect={() => onAsk('set-aside')}>Set aside, with a reason</MenuItem>
        )}
        <MenuItem onSelect={() => onAsk('waive')}>Waive, with a reason</MenuItem>
      </Menu>
    </>
  );
}

type DialogProps = Pick<FindingActionsProps, 'number' | 'revision' | 'finding'> & { onClose: () => void };

function WaiveDialog({ number, revision, finding, onClose }: DialogProps) {
  const waive = useWaiveFinding(number);
  const countersigned = finding.grade === 'must-answer';
  return (
    <WordsDialog
      title={countersigned ? 'Propose to waive this finding' : 'Waive this finding'}
      description={finding.message}
      label="Reason"
      hint={
        countersigned
          ? 'A Must answer is waived once a second reviewer has countersigned.'
          : 'Kept with the record of the case.'
      }
      confirm={countersigned ? 'Propose the waiver' : 'Waive'}
      busy={waive.isPending}
      error={waive.error}
      onConfirm={(reason) =>
        waive.mutate(
          { params: { fingerprint: finding.fingerprint }, body: { revision, reason } },
          { onSuccess: onClose },
        )
      }
      onClose={onClose}
    />
  );
}

function SetAsideDialog({ number, revision, finding, onClose }: DialogProps) {
  const setAside = useSetAsideFinding(number);
  return (
    <WordsDialog
      title="Set this finding aside"
      description={finding.message}
      label="Reason"
      hint="The applicant is not asked about it."
      confirm="Set aside"
      busy={setAside.isPending}
      error={setAside.error}
      onConfirm={(reason) =>
        setAside.mutate(
          { params: { fingerprint: finding.fingerprint }, body: { revision, reason } },
          { onSuccess: onClose },
        )
      }
      onClose={onClose}
    />
  );
}
