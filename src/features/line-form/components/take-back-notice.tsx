import { useEffect, useRef } from 'react';
import { flushSync } from 'react-dom';
import { Notice } from '../../../components/feedback/notice';
import { Button } from '../../../components/ui/button';
import { useLineFormView } from '../hooks/form-context';
import { useTakeBack } from '../hooks/take-back-context';
import type { Taken } from '../hooks/take-back-context';
import { focusOn } from '../model/focus';

/** What was just taken away in this part of the form, while it can still come back. */
export function TakeBackNotice({ at }: { at: string }) {
  const { taken } = useTakeBack();
  return taken?.at === at ? <Offer taken={taken} /> : null;
}

function Offer({ taken }: { taken: Taken }) {
  const { change } = useLineFormView();
  const { end } = useTakeBack();
  const box = useRef<HTMLDivElement>(null);
  useEffect(() => {
    // The button that was pressed may be gone with what it took away.
    if (document.activeElement === document.body) box.current?.querySelector('button')?.focus();
  }, [taken]);
  const settle = (apply: () => void, focusId: string) => {
    // At once, so that the control is there when the focus goes to it.
    flushSync(() => {
      apply();
      end();
    });
    focusOn(focusId);
  };
  const takeBack = () =>
    settle(() => {
      change(taken.back);
      taken.onBack?.();
    }, taken.backFocusId ?? taken.focusId);
  return (
    <div ref={box} className="mt-4 field:col-span-2">
      <Notice announce title={taken.words}>
        <div className="actions !mt-3">
          <Button small onClick={takeBack}>
            Take it back
          </Button>
          <Button small kind="plain" onClick={() => settle(() => undefined, taken.focusId)}>
            Leave it so
          </Button>
        </div>
      </Notice>
    </div>
  );
}
