import { useMemo, useState } from 'react';
import type { ReactNode } from 'react';
import { flushSync } from 'react-dom';
import { Notice } from '../../../components/feedback/notice';
import { Button, ButtonLink } from '../../../components/ui/button';
import { formatInstant } from '#shared/format/dates';
import { LineFormContext } from '../hooks/form-context';
import { TakeBackContext, useTakenBack } from '../hooks/take-back-context';
import type { LineFormView } from '../hooks/form-context';
import type { LineEditor } from '../hooks/use-line-editor';
import { ConflictNotice } from './conflict-notice';
import { DeclaredValues } from './declared-values';
import { FormFaults } from './form-faults';
import { LineDrawing } from './line-drawing';
import { LineIdentity } from './line-identity';
import { SectionFields } from './section-fields';
import type { FormNotes } from '../hooks/use-field-notes';
import type { StandingPut } from '../hooks/use-put';

interface LineFormProps {
  editor: LineEditor;
  notes: FormNotes;
  view: Omit<LineFormView, 'form' | 'set' | 'change' | 'put' | 'noteAt' | 'enter' | 'leave'>;
  /** Values that the check put in, until they are kept or taken back. */
  put: StandingPut | null;
  /** Where “Back to the application” leads. */
  backTo: string;
  clearanceM: number | null;
  badPositions: (section: number) => ReadonlySet<number>;
  /** The live check, under the drawing. */
  children: ReactNode;
}

const sectionOf = (pointer: string): number | null => {
  const found = /^\/sections\/(\d+)/.exec(pointer);
  return found ? Number(found[1]) : null;
};

/** The section on the table: the one chosen, or the one that a value was put into. */
function useShownSection(count: number, put: StandingPut | null) {
  const [shown, setShown] = useState(0);
  const [seen, setSeen] = useState<StandingPut['values'] | null>(null);
  const values = put?.values ?? null;
  if (values !== seen) {
    setSeen(values);
    setShown(sectionOf(values?.[0]?.pointer ?? '') ?? shown);
  }
  return [Math.min(shown, count - 1), setShown] as const;
}

/** Form, drawing and live check of a line: one state, seen three ways. */
export function LineForm({
  editor,
  notes,
  view,
  put,
  backTo,
  clearanceM,
  badPositions,
  children,
}: LineFormProps) {
  const takeBack = useTakenBack();
  const [section, setShown] = useShownSection(editor.form.sections.length, put);
  const context = useMemo(
    (): LineFormView => ({
      ...view,
      form: editor.form,
      set: editor.set,
      change: editor.change,
      put,
      noteAt: notes.noteAt,
      enter: notes.enter,
      leave: notes.leave,
    }),
    [view, editor.form, editor.set, editor.change, put, notes.noteAt, notes.enter, notes.leave],
  );
  const goTo = (pointer: string) => {
    const index = sectionOf(pointer);
    // At once, so that the field is there when the summary's link looks for it.
    if (index !== null && index !== section) flushSync(() => setShown(index));
  };
  const saveLine = async () => {
    notes.showAll();
    await editor.flush();
  };
  return (
    <LineFormContext value={context}>
      <TakeBackContext value={takeBack}>
        <div className="form-columns">
          <form
            noValidate
            // What takes the focus is never left behind the count at the foot of a phone.
            className="min-w-0 [&_input]:scroll-mb-16 [&_select]:scroll-mb-16"
            onSubmit={(event) => {
              event.preventDefault();
              void saveLine();
            }}
          >
            {editor.save.kind === 'conflict' && (
              <ConflictNotice
                theirs={editor.theirs}
                onKeepMine={editor.keepMine}
                onTakeTheirs={editor.takeTheirs}
              />
            )}
            {editor.restoredFrom && editor.save.kind !== 'conflict' && (
              <Notice className="mb-6" announce>
                {`What you typed until ${formatInstant(editor.restoredFrom)} had not reached us; it stands here again.`}
              </Notice>
            )}
            <FormFaults items={notes.shown} asked={notes.asked} onGo={goTo} />
            <div className="sheet sheet-main">
              <LineIdentity />
              <DeclaredValues />
              <SectionFields shown={section} onShow={setShown} />
              <FormFoot
                faults={notes.all.length}
                missing={notes.all.length - notes.shown.length}
                backTo={backTo}
                onAsk={notes.showAll}
              />
            </div>
          </form>
          <div className="stays-in-view grid min-w-0 grid-cols-[minmax(0,1fr)] gap-6 cols:max-h-[calc(100dvh-32px)] cols:overflow-y-auto [&>.sheet]:mt-0">
            <LineDrawing shown={section} clearanceM={clearanceM} bad={badPositions(section)} />
            {children}
          </div>
        </div>
      </TakeBackContext>
    </LineFormContext>
  );
}

interface FormFootProps {
  /** Everything that stands in the way of filing. */
  faults: number;
  /** What of it is not shown yet. */
  missing: number;
  backTo: string;
  onAsk: () => void;
}

function FormFoot({ faults, missing, backTo, onAsk }: FormFootProps) {
  return (
    <div className="sheet-foot !justify-start items-center bg-paper">
      <Button type="submit" kind="primary">
        Save line
      </Button>
      <ButtonLink to={backTo}>Back to the application</ButtonLink>
      {missing > 0 && (
        <Button kind="plain" onClick={onAsk}>
          {missing === 1
            ? 'One field stands in the way of filing: show it'
            : `${missing} fields stand in the way of filing: show them`}
        </Button>
      )}
      {missing === 0 && faults > 0 && (
        <span className="text-ink-soft">A line with an open error can be saved, not filed.</span>
      )}
    </div>
  );
}
