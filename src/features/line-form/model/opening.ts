import type { DraftLine } from '#shared/contracts/api.generated';
import type { SaveState } from './autosaver';
import { blankLine } from './blank';
import type { LineForm } from './form-types';
import { openForm } from './from-line';
import type { KeptLine } from './local-keep';

/** How a form begins. */
export interface Opening {
  form: LineForm;
  version: number;
  save: SaveState;
  /** When the texts were typed that only the browser had. */
  restored: string | null;
  /** What the browser had was made on an older version than the server has now. */
  conflict: boolean;
}

/**
 * Begins with what the browser kept of this person's unsaved changes, else with what the server has, else
 * empty. Kept changes that were made on another version than the server's are a conflict, for their writer
 * to settle; until then they stand in the form.
 */
export function opening(saved: DraftLine | null, kept: KeptLine | null): Opening {
  const version = saved?.version ?? 0;
  if (!kept) {
    return {
      form: saved ? openForm(saved.line, saved.asTyped) : blankLine(),
      version,
      save: { kind: 'saved', at: saved ? new Date(saved.updatedAt) : null },
      restored: null,
      conflict: false,
    };
  }
  const conflict = kept.version !== version;
  return {
    form: openForm(kept.line, kept.asTyped),
    version: conflict ? kept.version : version,
    save: conflict ? { kind: 'conflict' } : { kind: 'waiting' },
    restored: kept.at,
    conflict,
  };
}
