import { useEffect, useRef } from 'react';
import { GradeMark } from '../ui/grade-mark';

export interface SummaryItem {
  /** Id of the control at fault; without one the item is words only. */
  fieldId?: string;
  message: string;
}

interface ErrorSummaryProps {
  title: string;
  items: readonly SummaryItem[];
  /** Takes the focus when it appears, as after a try to submit. */
  takesFocus?: boolean;
}

function goTo(fieldId: string): void {
  const field = document.getElementById(fieldId);
  field?.focus({ preventScroll: true });
  field?.scrollIntoView({ block: 'center' });
}

/** What stands in the way, on top of a form; each item leads to its field. */
export function ErrorSummary({ title, items, takesFocus = true }: ErrorSummaryProps) {
  const box = useRef<HTMLDivElement>(null);
  const shown = items.length > 0;
  useEffect(() => {
    if (shown && takesFocus) box.current?.focus();
  }, [shown, takesFocus]);
  if (!shown) return null;
  return (
    <div className="error-summary" role="alert" tabIndex={-1} ref={box}>
      <h2>
        <GradeMark grade="must-answer" />
        {title}
      </h2>
      <ul>
        {items.map(({ fieldId, message }) => (
          <li key={`${fieldId}:${message}`}>
            {fieldId ? (
              <a
                href={`#${fieldId}`}
                onClick={(event) => {
                  event.preventDefault();
                  goTo(fieldId);
                }}
              >
                {message}
              </a>
            ) : (
              message
            )}
          </li>
        ))}
      </ul>
    </div>
  );
}
