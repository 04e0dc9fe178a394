import { useState } from 'react';
import type { Run } from '#shared/contracts/api.generated';
import { formatInstant } from '#shared/format/dates';
import { ProblemNotice } from '../../../components/feedback/problem-notice';
import { WordsDialog } from '../../../components/feedback/words-dialog';
import { Button } from '../../../components/ui/button';
import { GradeCountsInline } from '../../../components/ui/grade-counts';
import { Sheet } from '../../../components/ui/sheet';
import { useAdoptRun } from '../api/adopt-run';
import { useCheckAgain } from '../api/check-again';
import { useRuns } from '../api/list-runs';
import { RunComparisonDialog } from './run-comparison-dialog';

interface RunsMiniProps {
  number: string;
  letter: string;
  /** The reviewer of the case may check again and adopt. */
  mayRun: boolean;
}

/** The checks of a revision: the one made at filing governs until the reviewer adopts another. */
export function RunsMini({ number, letter, mayRun }: RunsMiniProps) {
  const runs = useRuns(number, letter);
  const again = useCheckAgain(number);
  const [adopting, setAdopting] = useState<Run | null>(null);
  const [comparing, setComparing] = useState<Run | null>(null);
  const governing = runs.find((run) => run.governing);
  return (
    <Sheet side title="Checks" aside={`revision ${letter}`}>
      <ul className="mini-list">
        {runs.map((run) => (
          <RunItem
            key={run.ordinal}
            run={run}
            onCompare={governing && !run.governing && run.state === 'done' ? () => setComparing(run) : null}
            onAdopt={mayRun && !run.governing && run.state === 'done' ? () => setAdopting(run) : null}
          />
        ))}
      </ul>
      {mayRun && (
        <div className="grid gap-2 px-4 pb-4 pt-2">
          <Button
            small
            className="whitespace-normal"
            busy={again.isPending}
            onClick={() => again.mutate({ params: { letter }, body: {} })}
          >
            Check again under the rules in force
          </Button>
          <ProblemNotice error={again.error} />
        </div>
      )}
      {adopting && (
        <AdoptDialog number={number} letter={letter} run={adopting} onClose={() => setAdopting(null)} />
      )}
      {comparing && governing && (
        <RunComparisonDialog
          number={number}
          letter={letter}
          from={governing}
          to={comparing}
          onClose={() => setComparing(null)}
        />
      )}
    </Sheet>
  );
}

interface RunItemProps {
  run: Run;
  onCompare: (() => void) | null;
  onAdopt: (() => void) | null;
}

function RunItem({ run, onCompare, onAdopt }: RunItemProps) {
  const { grades } = run;
  return (
    <li>
      <b className="font-semibold">{run.ordinal}</b>
      <span>{run.governing ? 'governs' : run.reason === 'again' ? 'checked again' : 'at filing'}</span>
      {run.state === 'done' && grades ? (
        <GradeCountsInline
          counts={{ 'must-answer': grades.mustAnswer, explain: grades.explain, note: grades.note }}
        />
      ) : (
        <span className="text-ink-soft">{stateWords(run)}</span>
      )}
      <span className="mini-more">
        {formatInstant(run.finishedAt ?? run.createdAt)}
        {run.engine && `, engine ${run.engine}`}
        {run.ruleSet && `, rules ${run.ruleSet}`}
      </span>
      {(onCompare || onAdopt) && (
        <span className="mini-more flex gap-2 pt-1">
          {onCompare && (
            <Button
              small
              onClick={onCompare}
              aria-label={`Compare check ${run.ordinal} with the one that governs`}
            >
              Compare
            </Button>
          )}
          {onAdopt && (
            <Button small onClick={onAdopt} aria-label={`Adopt check ${run.ordinal}`}>
              Adopt
            </Button>
          )}
        </span>
      )}
    </li>
  );
}

function stateWords({ state, linesChecked, lineCount }: Run): string {
  if (state === 'failed') return 'failed';
  return state === 'queued' ? 'waiting' : `${linesChecked} of ${lineCount}`;
}

interface AdoptDialogProps {
  number: string;
  letter: string;
  run: Run;
  onClose: () => void;
}

function AdoptDialog({ number, letter, run, onClose }: AdoptDialogProps) {
  const adopt = useAdoptRun(number);
  return (
    <WordsDialog
      title={`Let check ${run.ordinal} govern`}
      description="Its findings then take the place of those that govern now. What was settled or waived stays where code, circuit and figures are equal."
      label="Reason"
      confirm={`Adopt check ${run.ordinal}`}
      busy={adopt.isPending}
      error={adopt.error}
      onConfirm={(reason) =>
        adopt.mutate({ params: { letter, run: run.ordinal }, body: { reason } }, { onSuccess: onClose })
      }
      onClose={onClose}
    />
  );
}
