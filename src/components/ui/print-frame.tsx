import type { ReactNode } from 'react';
import { TitleBlock, type TitleBlockCell } from './title-block';

interface PrintFrameProps {
  /** Said on every page. */
  caution: ReactNode;
  /** The title block at the foot of every page. */
  cells: readonly TitleBlockCell[];
}

/**
 * What a printed page carries: the frame, the caution and the title block at its foot. Fixed boxes are
 * repeated on every sheet of paper; on a screen there is nothing to see.
 */
export function PrintFrame({ caution, cells }: PrintFrameProps) {
  return (
    <div className="print-frame" aria-hidden="true">
      <p className="print-caution">
        <b>Caution.</b> {caution}
      </p>
      <TitleBlock label="Title block" cells={cells.map(({ fold: _fold, meter: _meter, ...cell }) => cell)} />
    </div>
  );
}
