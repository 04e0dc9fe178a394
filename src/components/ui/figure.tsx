import { splitFigure } from './split-figure';

/** A number of a column, standing on its decimal point. */
export function Figure({ children }: { children: string }) {
  const [whole, fraction] = splitFigure(children);
  return (
    <span className="figure">
      <span>{whole}</span>
      <span>{fraction}</span>
    </span>
  );
}
