import type { ReactNode } from 'react';
import { classNames } from './class-names';

interface DisclosureProps {
  summary: ReactNode;
  children: ReactNode;
  open?: boolean;
  className?: string;
}

/** Something more, shown when asked for. */
export function Disclosure({ summary, children, open, className }: DisclosureProps) {
  return (
    <details className={classNames('disclosure', className)} open={open}>
      <summary>
        <svg width={7} height={10} viewBox="0 0 7 10" aria-hidden="true">
          <path d="M0 0 7 5 0 10Z" fill="currentColor" />
        </svg>
        {summary}
      </summary>
      {children}
    </details>
  );
}
