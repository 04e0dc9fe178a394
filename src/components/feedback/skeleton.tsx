interface LinesProps {
  lines?: number;
  label?: string;
}

const WIDTHS = ['92%', '78%', '86%', '64%', '81%'];

/** The place of words that are on their way, ruled rather than spinning. */
export function SkeletonLines({ lines = 3, label = 'Loading' }: LinesProps) {
  return (
    <div role="status" aria-label={label} className="grid gap-3">
      {Array.from({ length: lines }, (_, i) => (
        <span key={i} className="skeleton" style={{ height: 12, width: WIDTHS[i % WIDTHS.length] }} />
      ))}
    </div>
  );
}

/** The place of a table's rows. */
export function SkeletonRows({ rows = 6, label = 'Loading' }: { rows?: number; label?: string }) {
  return (
    <div role="status" aria-label={label}>
      {Array.from({ length: rows }, (_, i) => (
        <div key={i} className="flex h-row items-center gap-6 border-b border-rule px-6">
          <span className="skeleton" style={{ height: 12, width: 64 }} />
          <span className="skeleton" style={{ height: 12, flex: 1, maxWidth: 320 }} />
          <span className="skeleton" style={{ height: 12, width: 96 }} />
        </div>
      ))}
    </div>
  );
}

/** A page on its way: heading, title block, one sheet. */
export function SkeletonPage() {
  return (
    <div role="status" aria-label="Loading the page">
      <div className="page-head">
        <div className="grid gap-3">
          <span className="skeleton" style={{ height: 22, width: 'min(320px, 80%)' }} />
          <span className="skeleton" style={{ height: 12, width: 'min(460px, 100%)' }} />
        </div>
      </div>
      <div className="sheet sheet-main p-6">
        <SkeletonLines lines={6} />
      </div>
    </div>
  );
}
