import { useQueryClient } from '@tanstack/react-query';
import { useCallback, useEffect, useMemo, useRef, useState } from 'react';
import type { DraftLine } from '#shared/contracts/api.generated';
import { canonicalJson } from '#shared/filing/canonical';
import { useIntention } from '../../../lib/api/intention';
import { caseKey } from '../../../lib/queries/case-key';
import { draftLineQuery, readDraftLine } from '../api/get-draft-line';
import { isStale, saveDraftLine } from '../api/save-draft-line';
import { Autosaver } from '../model/autosaver';
import type { SaveState } from '../model/autosaver';
import { setAt } from '../model/edit';
import type { FormPath, LineForm } from '../model/form-types';
import { openForm } from '../model/from-line';
import { dropKept, keepKey, readKept, writeKept } from '../model/local-keep';
import { opening } from '../model/opening';
import { readForm } from '../model/to-line';
import type { FormReading } from '../model/to-line';
import type { PlacedNote } from './use-field-notes';

export interface LineEditorInput {
  number: string;
  lineKey: string;
  userId: string;
  /** The line as the server has it; null for one that is not saved yet. */
  saved: DraftLine | null;
}

export interface LineEditor {
  form: LineForm;
  reading: FormReading;
  /** Texts that are no numbers, at their places. */
  textNotes: readonly PlacedNote[];
  set: (path: FormPath, value: unknown) => void;
  change: (change: (form: LineForm) => LineForm) => void;
  save: SaveState;
  /** Sends what waits and resolves when it has arrived or cannot. */
  flush: () => Promise<void>;
  /** When the text was typed that stood only in this browser, if the form was opened with it. */
  restoredFrom: string | null;
  /** After a conflict: what somebody else saved, once it has been read. */
  theirs: DraftLine | null;
  keepMine: () => void;
  takeTheirs: () => void;
}

/** How long the typing must pause before a save, and a failed save before the next try. */
const DELAY_MS = 900;
const RETRY_MS = 8000;

/** What is told about saving while it goes on. */
interface SaverEvents {
  onState: (state: SaveState) => void;
  onTheirs: (theirs: DraftLine | null) => void;
}

/** The autosave of one line: keeps the cache in step, reads the other version after a conflict. */
function useSaver({ number, lineKey }: LineEditorInput, version: number, key: string, events: SaverEvents) {
  const client = useQueryClient();
  const intention = useIntention();
  const [saver] = useState(() => {
    let sent: Record<string, unknown> | null = null;
    const made: Autosaver<FormReading> = new Autosaver<FormReading>(version, {
      save: async ({ line, asTyped }, base) => {
        const body = { version: base, line, asTyped };
        sent = line;
        try {
          const answer = await saveDraftLine(number, lineKey, body, intention.keyFor(body));
          intention.ended(null);
          client.setQueryData(draftLineQuery(number, lineKey).queryKey, answer);
          // Read anew when somebody looks again; nothing on this page waits for it.
          void client.invalidateQueries({ queryKey: caseKey(number), refetchType: 'none' });
          return { version: answer.version, at: new Date(answer.updatedAt) };
        } catch (error) {
          intention.ended(error);
          throw error;
        }
      },
      isConflict: isStale,
      onState: (state) => {
        if (state.kind !== 'conflict') return events.onState(state);
        void readDraftLine(number, lineKey).then((theirs) => {
          // A save of ours whose answer was lost on the way is no conflict.
          if (theirs && sent && canonicalJson(theirs.line) === canonicalJson(sent))
            return made.goOn(theirs.version);
          events.onTheirs(theirs);
          return events.onState(state);
        });
      },
      onSettled: () => dropKept(key),
      delayMs: DELAY_MS,
      retryMs: RETRY_MS,
    });
    return made;
  });
  return saver;
}

/** The form's state, kept in the browser at each change and saved to the draft after each pause. */
export function useLineEditor(input: LineEditorInput): LineEditor {
  const key = keepKey(input.userId, input.number, input.lineKey);
  const [start] = useState(() => opening(input.saved, readKept(key)));
  const [form, setForm] = useState<LineForm>(start.form);
  const [theirs, setTheirs] = useState<DraftLine | null>(start.conflict ? input.saved : null);
  const [save, setSave] = useState<SaveState>(start.save);
  const current = useRef(form);
  const saver = useSaver(input, start.version, key, { onState: setSave, onTheirs: setTheirs });

  const change = useCallback(
    (apply: (form: LineForm) => LineForm) => {
      const next = apply(current.current);
      if (next === current.current) return;
      current.current = next;
      setForm(next);
      const reading = readForm(next);
      const { line, asTyped } = reading;
      writeKept(key, { line, asTyped, version: saver.base, at: new Date().toISOString() });
      saver.change(reading);
    },
    [key, saver],
  );

  useEffect(() => {
    if (start.restored) saver.change(readForm(start.form));
    return () => void saver.flush();
  }, [saver, start]);

  const reading = useMemo(() => readForm(form), [form]);
  return {
    form,
    reading,
    textNotes: useMemo(
      () => reading.faults.map(({ pointer, message }) => ({ pointer, message, grade: 'must-answer' })),
      [reading],
    ),
    change,
    set: useCallback((path: FormPath, value: unknown) => change((f) => setAt(f, path, value)), [change]),
    save,
    flush: useCallback(() => saver.flush(), [saver]),
    restoredFrom: start.restored,
    theirs,
    keepMine: () => {
      setTheirs(null);
      void saver.keepMine(theirs?.version ?? 0, readForm(current.current));
    },
    takeTheirs: () => {
      dropKept(key);
      current.current = openForm(theirs?.line ?? {}, theirs?.asTyped);
      setForm(current.current);
      saver.takeTheirs({ version: theirs?.version ?? 0, at: new Date(theirs?.updatedAt ?? Date.now()) });
      setTheirs(null);
    },
  };
}
