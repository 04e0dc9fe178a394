import { Notice } from '../../../components/feedback/notice';
import { Button } from '../../../components/ui/button';
import type { PutValue } from '../model/put-values';

interface PutNoticeProps {
  values: readonly PutValue[];
  onKeep: () => void;
  onUndo: () => void;
}

/** Values that the check put in, for the applicant to confirm or to take back. */
export function PutNotice({ values, onKeep, onUndo }: PutNoticeProps) {
  return (
    <Notice className="mb-6" announce title="Put in for you to confirm">
      <ul>
        {values.map((v) => (
          <li key={v.pointer}>{`${v.label} is now ${v.after}, was ${v.before}.`}</li>
        ))}
      </ul>
      <p className="mt-1">Keep it only if your own source says so: you declare these values.</p>
      <div className="actions !mt-3">
        <Button small kind="primary" onClick={onKeep}>
          Keep
        </Button>
        <Button small onClick={onUndo}>
          Take it back
        </Button>
      </div>
    </Notice>
  );
}
