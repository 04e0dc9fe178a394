import type { PaperDimension } from './paper-dimension';

const ARROW = 7;
const HALF = 1.9;

function arrowAlong(along: 'x' | 'y', at: number, tip: number, towards: number): string {
  const back = tip - Math.sign(towards) * ARROW;
  return along === 'x'
    ? `M${tip} ${at}L${back} ${at - HALF}V${at + HALF}Z`
    : `M${at} ${tip}L${at - HALF} ${back}H${at + HALF}Z`;
}

function linePath({ along, at, from, to, box, inGap }: PaperDimension): string {
  const [low, high] = from < to ? [from, to] : [to, from];
  const stroke = (a: number, b: number) => (along === 'x' ? `M${a} ${at}H${b}` : `M${at} ${a}V${b}`);
  if (!inGap) return stroke(low, high);
  const middle = along === 'x' ? box.x : box.y;
  const half = (along === 'x' ? box.width : box.height) / 2;
  return stroke(low, middle - half) + stroke(middle + half, high);
}

/** A dimension line with its extension lines, arrowheads and the figure in a gap of the line. */
export function DimensionLine({ dimension }: { dimension: PaperDimension }) {
  const { along, at, from, to, box, text, bad, extensions } = dimension;
  const line = bad ? 'stroke-vermilion' : 'stroke-steel';
  const fill = bad ? 'fill-vermilion font-strong' : 'fill-steel font-medium';
  const short = Math.abs(to - from) < 2 * ARROW + 2;
  const turn = short ? -1 : 1;
  return (
    <g>
      <path
        d={extensions.map(([x1, y1, x2, y2]) => `M${x1} ${y1}L${x2} ${y2}`).join('')}
        fill="none"
        strokeWidth={0.75}
        strokeOpacity={0.6}
        className={line}
      />
      <path d={linePath(dimension)} fill="none" className={line} />
      <path
        d={arrowAlong(along, at, from, turn * (from - to)) + arrowAlong(along, at, to, turn * (to - from))}
        className={fill}
      />
      <text x={box.x} y={box.y + 4} textAnchor="middle" style={{ fontSize: 11.5 }} className={fill}>
        {text}
      </text>
    </g>
  );
}
