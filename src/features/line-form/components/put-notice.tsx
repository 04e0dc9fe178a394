import { useEffect } from 'react';
import { Notice } from '../../../components/feedback/notice';
import { Button } from '../../../components/ui/button';
import { useLineFormView } from '../hooks/form-context';
import type { StandingPut } from '../hooks/use-put';
import { focusOn } from '../model/focus';
import { fieldId, shownPointer } from '../model/pointers';

/** Values that the check put in, right under the first of their fields, to be confirmed or taken back. */
export function PutHere({ pointer }: { pointer: string }) {
  const { form, put } = useLineFormView();
  const first = put?.values[0];
  if (!put || !first || shownPointer(form, first.pointer) !== pointer) return null;
  return <PutNotice key={`${first.after} ${put.values.length}`} put={put} id={fieldId(pointer)} />;
}

function PutNotice({ put, id }: { put: StandingPut; id: string }) {
  // The reader comes from the check, which may stand a screen away.
  useEffect(() => focusOn(id), [id]);
  const settle = (apply: () => void) => {
    apply();
    focusOn(id);
  };
  return (
    <Notice className="mt-3" announce title="Put in for you to confirm">
      <ul>
        {put.values.map((v) => (
          <li key={v.pointer}>{`${v.label} is now ${v.after}, was ${v.before}.`}</li>
        ))}
      </ul>
      <p className="mt-1">Keep it only if your own source says so: you declare these values.</p>
      <div className="actions !mt-3">
        <Button small kind="primary" onClick={() => settle(put.keep)}>
          Keep
        </Button>
        <Button small onClick={() => settle(put.undo)}>
          Take it back
        </Button>
      </div>
    </Notice>
  );
}
