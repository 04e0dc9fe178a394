import type { ReactNode } from 'react';

interface EmptyStateProps {
  title: string;
  /** What to do next. */
  children?: ReactNode;
  actions?: ReactNode;
}

/** Where nothing is yet: says so, and what comes next. An empty beam stands level. */
export function EmptyState({ title, children, actions }: EmptyStateProps) {
  return (
    <div className="grid justify-items-center gap-2 px-6 py-12 text-center">
      <svg width={64} height={30} viewBox="0 0 64 30" aria-hidden="true" className="stroke-rule-strong">
        <g fill="none" strokeWidth={1.5} strokeLinecap="round" strokeLinejoin="round">
          <path d="M4 12H60M26 28 32 13 38 28" />
          <circle cx={12} cy={7} r={4.5} strokeDasharray="2 2.5" />
          <circle cx={52} cy={7} r={4.5} strokeDasharray="2 2.5" />
        </g>
      </svg>
      <p className="font-strong">{title}</p>
      {children && <div className="max-w-prose text-control text-ink-soft">{children}</div>}
      {actions && <div className="actions justify-center">{actions}</div>}
    </div>
  );
}
