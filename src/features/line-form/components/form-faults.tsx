import { fixed } from '#shared/format/numbers';

import { ErrorSummary } from '../../../components/feedback/error-summary';
import type { NoteItem } from '../hooks/use-field-notes';
import { fieldId } from '../model/pointers';

interface FormFaultsProps {
  items: readonly NoteItem[];
  /** The writer has just asked for them: the summary takes the focus. */
  asked: boolean;
  /** Brings a field onto the page that stands on another section. */
  onGo: (pointer: string) => void;
}

/** What stands in the way of filing, each leading to its field. */
export function FormFaults({ items, asked, onGo }: FormFaultsProps) {
  const count = items.length;
  return (
    <div
      onClickCapture={(event) => {
        const href = (event.target as HTMLElement).closest('a')?.getAttribute('href');
        const item = items.find((i) => `#${fieldId(i.pointer)}` === href);
        if (item) onGo(item.pointer);
      }}
    >
      <ErrorSummary
        title={
          count === 1
            ? 'One field stands in the way of filing'
            : `${fixed(count, 0)} fields stand in the way of filing`
        }
        items={items.map((i) => ({ fieldId: fieldId(i.pointer), message: i.message }))}
        takesFocus={asked}
      />
    </div>
  );
}
