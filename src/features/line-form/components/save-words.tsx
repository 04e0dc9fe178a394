import { formatDate, formatInstant, formatTime } from '#shared/format/dates';
import type { SaveState } from '../model/autosaver';

/** Where saving stands, in a few words: "Saved at 10:42". */
export function SaveWords({ state }: { state: SaveState }) {
  return <span aria-live="polite">{words(state)}</span>;
}

function savedWords(at: Date): string {
  const today = formatDate(at) === formatDate(new Date());
  return today ? `Saved at ${formatTime(at)}.` : `Saved on ${formatInstant(at)}.`;
}

function words(state: SaveState): string {
  switch (state.kind) {
    case 'saved':
      return state.at ? savedWords(state.at) : 'Not saved yet.';
    case 'waiting':
    case 'saving':
      return 'Saving.';
    case 'failed':
      return 'Not saved yet: kept in this browser, tried again in a moment.';
    case 'conflict':
      return 'Not saved: somebody else saved this line meanwhile.';
  }
}
