import { useId, type ReactNode } from 'react';
import { classNames } from './class-names';

interface SheetProps {
  /** The page's main sheet carries centring marks at its top and bottom edge. */
  main?: boolean;
  /** A narrow sheet in a side column, with a smaller head. */
  side?: boolean;
  title?: ReactNode;
  /** Said at the right of the title. */
  aside?: ReactNode;
  /** For a sheet without a visible title. */
  label?: string;
  id?: string;
  className?: string;
  children: ReactNode;
}

/** A sheet of the drawing set: everything stands on one. */
export function Sheet({ main, side, title, aside, label, id, className, children }: SheetProps) {
  const titleId = useId();
  return (
    <section
      id={id}
      className={classNames('sheet', main && 'sheet-main', side && 'sheet-side', className)}
      aria-labelledby={title ? titleId : undefined}
      aria-label={title ? undefined : label}
    >
      {title && (
        <SheetHead aside={aside}>
          <h2 id={titleId}>{title}</h2>
        </SheetHead>
      )}
      {children}
    </section>
  );
}

/** The head of a sheet or of a part of it: a heading, and what is said beside it. */
export function SheetHead({ children, aside }: { children: ReactNode; aside?: ReactNode }) {
  return (
    <div className="sheet-head">
      {children}
      {aside !== undefined && <div>{aside}</div>}
    </div>
  );
}

interface SheetSectionProps {
  id?: string;
  title?: ReactNode;
  aside?: ReactNode;
  className?: string;
  children: ReactNode;
}

/** A part of a sheet, ruled off from the one above. */
export function SheetSection({ id, title, aside, className, children }: SheetSectionProps) {
  const titleId = useId();
  return (
    <section
      id={id}
      className={classNames('sheet-cut', className)}
      aria-labelledby={title ? titleId : undefined}
    >
      {title && (
        <SheetHead aside={aside}>
          <h2 id={titleId}>{title}</h2>
        </SheetHead>
      )}
      {children}
    </section>
  );
}
