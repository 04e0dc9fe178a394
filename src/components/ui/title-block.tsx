import { Fragment, type CSSProperties, type ReactNode } from 'react';
import { classNames } from './class-names';
import { Disclosure } from './disclosure';

/** What a cell is, where a page's block folds to two rows on a phone. All others go under a disclosure. */
export type FoldRole = 'name' | 'revision' | 'number' | 'state' | 'due';

export interface TitleBlockCell {
  label: string;
  value: ReactNode;
  /** Said behind the value in a softer voice. */
  aside?: ReactNode;
  /** Columns of twelve. */
  span: number;
  /** Name and number, set larger. */
  lead?: boolean;
  /** Holds a window meter at its right. */
  meter?: ReactNode;
  fold?: FoldRole;
}

interface TitleBlockProps {
  label: string;
  cells: readonly TitleBlockCell[];
}

function Cell({ cell }: { cell: TitleBlockCell }) {
  const words = (
    <>
      <span className={cell.lead ? 'lead-value' : undefined}>{cell.value}</span>
      {cell.aside !== undefined && <span className="aside-value"> {cell.aside}</span>}
    </>
  );
  return (
    <div
      style={{ '--span': cell.span } as CSSProperties}
      className={classNames(
        cell.fold ? `fold-${cell.fold}` : 'folds',
        cell.meter !== undefined && 'meter-cell',
      )}
    >
      <dt>{cell.label}</dt>
      <dd>
        {cell.meter === undefined ? words : <span>{words}</span>}
        {cell.meter}
      </dd>
    </div>
  );
}

/** The ruled block in the corner of a drawing: what this sheet is, its number, revision and state. */
export function TitleBlock({ label, cells }: TitleBlockProps) {
  const folded = cells.filter((cell) => !cell.fold);
  const folds = cells.some((cell) => cell.fold);
  return (
    <div>
      <dl className="title-block" aria-label={label}>
        {cells.map((cell) => (
          <Cell key={cell.label} cell={cell} />
        ))}
      </dl>
      {folds && folded.length > 0 && (
        <Disclosure className="title-block-more" summary={folded.map((cell) => cell.label).join(', ')}>
          <dl>
            {folded.map((cell) => (
              <Fragment key={cell.label}>
                <dt>{cell.label}</dt>
                <dd>
                  {cell.value} {cell.aside}
                </dd>
              </Fragment>
            ))}
          </dl>
        </Disclosure>
      )}
    </div>
  );
}
