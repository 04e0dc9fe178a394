import { useSuspenseQuery } from '@tanstack/react-query';
import type { QueryClient } from '@tanstack/react-query';
import { useEffect, useMemo, useRef } from 'react';
import { Navigate, useLocation, useNavigate, useParams } from 'react-router-dom';
import { problemType } from '#shared/contracts/errors';
import { PageHead } from '../../components/ui/page-head';
import { hasDraft } from '../../features/applications/model/words';
import { draftLineQuery } from '../../features/line-form/api/get-draft-line';
import { LineForm } from '../../features/line-form/components/line-form';
import { LineTitleBlock } from '../../features/line-form/components/line-title-block';
import { SaveWords } from '../../features/line-form/components/save-words';
import { useFieldNotes } from '../../features/line-form/hooks/use-field-notes';
import { useFormSettings } from '../../features/line-form/hooks/use-form-settings';
import { useLineEditor } from '../../features/line-form/hooks/use-line-editor';
import type { LineEditorInput } from '../../features/line-form/hooks/use-line-editor';
import { usePut } from '../../features/line-form/hooks/use-put';
import type { Correction } from '../../features/line-form/model/put-values';
import { outcomeInFormWords } from '../../features/line-form/model/form-words';
import { writtenDigits } from '../../features/line-form/model/written-digits';
import { FindingCount } from '../../features/live-check/components/finding-count';
import { LiveCheckPanel } from '../../features/live-check/components/live-check';
import { useLiveCheck } from '../../features/live-check/hooks/use-live-check';
import { checkBasis } from '../../features/live-check/model/basis';
import { badPositions, blockersOf, drawingNotes } from '../../features/live-check/model/placed-notes';
import { useLeaveGuard } from '../../hooks/use-leave-guard';
import { ApiProblem } from '../../lib/api/problem';
import { useSession } from '../../lib/api/session';
import { linePath } from '../../lib/paths';
import { applicationQuery, useApplication } from '../../lib/queries/get-application';
import { draftQuery, useDraft } from '../../lib/queries/get-draft';
import { rulesQuery, useRules } from '../../lib/queries/get-rules';
import { conductorsQuery, useConductors } from '../../lib/queries/list-conductors';

type Params = Readonly<Record<string, string | undefined>>;

export function prefetch(client: QueryClient, { number = '', lineKey = '' }: Params) {
  return Promise.all([
    client.prefetchQuery(applicationQuery(number)),
    client.prefetchQuery(draftQuery(number)),
    client.prefetchQuery(draftLineQuery(number, lineKey)),
    client.prefetchQuery(rulesQuery()),
    client.prefetchQuery(conductorsQuery()),
  ]);
}

/** A correction that another page sends along, to be put in at once. */
interface PutState {
  put?: { correction: Correction; circuit: number };
}

function usePutFromElsewhere(put: ReturnType<typeof usePut>['put']): void {
  const { state, pathname } = useLocation() as { state: PutState | null; pathname: string };
  const navigate = useNavigate();
  const done = useRef(false);
  useEffect(() => {
    if (done.current || !state?.put) return;
    done.current = true;
    put(state.put.correction, state.put.circuit);
    void navigate(pathname, { replace: true, state: null });
  });
}

/** The check of what stands in the form, by the rules and conductors in force. */
function useCheckOf(editor: ReturnType<typeof useLineEditor>) {
  const rules = useRules();
  const conductors = useConductors();
  const basis = useMemo(() => checkBasis(rules, conductors), [rules, conductors]);
  const written = useMemo(() => writtenDigits(editor.form), [editor.form]);
  const check = useLiveCheck(editor.reading.line, written, basis);
  const { outcome } = check;
  const worded = useMemo(() => outcomeInFormWords(editor.form, outcome), [editor.form, outcome]);
  return { ...check, outcome: worded };
}

function LinePage({ input }: { input: LineEditorInput }) {
  const { number, lineKey } = input;
  const application = useApplication(number);
  const draft = useDraft(number);
  const editor = useLineEditor(input);
  const check = useCheckOf(editor);
  const { outcome } = check;
  const blockers = useMemo(() => blockersOf(outcome), [outcome]);
  const findings = useMemo(() => drawingNotes(outcome), [outcome]);
  const notes = useFieldNotes(editor.form, [...editor.textNotes, ...blockers], findings);
  const settings = useFormSettings(editor.form);
  const { put, offer, notice } = usePut(editor);
  usePutFromElsewhere(put);
  useLeaveGuard(editor.save.kind === 'failed' || editor.save.kind === 'conflict');
  const isNew = !draft.lines.some((l) => l.lineKey === lineKey);
  return (
    <>
      <PageHead
        title={editor.form.name.trim() || 'New line'}
        crumbs={[{ label: number, to: `/applications/${number}` }, { label: lineKey }]}
        lead={
          <>
            Enter what you declare and how the line hangs. The drawing and the check follow each keystroke.{' '}
            <SaveWords state={editor.save} />
          </>
        }
        block={
          <LineTitleBlock
            application={application}
            lineKey={lineKey}
            count={draft.lines.length + (isNew ? 1 : 0)}
            form={editor.form}
          />
        }
      />
      <LineForm
        editor={editor}
        notes={notes}
        view={settings.view}
        put={notice}
        backTo={`/applications/${number}`}
        clearanceM={settings.clearanceM}
        badPositions={(section) => badPositions(outcome, section)}
      >
        <LiveCheckPanel check={check} owed={notes.all.length} corrections={{ offer, put }} />
      </LineForm>
      <FindingCount check={check} />
    </>
  );
}

/** The form of one line of the draft. */
export function Component() {
  const { number = '', lineKey = '' } = useParams();
  const session = useSession();
  const application = useApplication(number);
  const { revision } = application;
  if (!session) return null;
  if (!hasDraft(application) && revision)
    return <Navigate to={linePath(session.role, number, revision, lineKey)} replace />;
  return <DraftLinePage number={number} lineKey={lineKey} userId={session.user.id} />;
}

/** The line of the draft as it is opened: one that is there, or the next one to come. */
function DraftLinePage({ number, lineKey, userId }: Omit<LineEditorInput, 'saved'>) {
  const draft = useDraft(number);
  const saved = useSuspenseQuery(draftLineQuery(number, lineKey)).data;
  if (saved === null && lineKey !== draft.nextLineKey)
    throw new ApiProblem({ type: problemType('not-found'), title: 'No such line in the draft', status: 404 });
  return <LinePage key={`${number}/${lineKey}`} input={{ number, lineKey, userId, saved }} />;
}
