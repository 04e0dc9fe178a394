import { Button } from '../../../components/ui/button';
import type { Selection } from '../hooks/use-selection';

interface SelectionBarProps {
  selection: Selection;
  nextName: string;
  onRaise: () => void;
}

/** Findings chosen so far, kept in view until they are raised together or let go. */
export function SelectionBar({ selection, nextName, onRaise }: SelectionBarProps) {
  const { findings, clear } = selection;
  if (findings.length === 0) return null;
  const lines = [...new Set(findings.map((f) => f.lineKey))].join(', ');
  return (
    <div className="selection-bar no-print" role="status">
      <span>
        <b className="font-strong">
          {findings.length === 1 ? 'One finding chosen' : `${findings.length} findings chosen`}
        </b>{' '}
        <span className="text-ink-soft">on {lines}</span>
      </span>
      <Button kind="primary" small onClick={onRaise}>{`Raise as ${nextName}`}</Button>
      <Button small onClick={clear}>
        Let go
      </Button>
    </div>
  );
}
