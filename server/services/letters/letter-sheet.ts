import PDFDocument from 'pdfkit';
import { LIGHT, type ColourToken } from '../../../shared/format/palette';
import { MARK_BOX, MARK_DISCS, MARK_STROKE_WIDTH, MARK_STROKES } from '../../../shared/format/mark';
import { CAUTION } from '../../../shared/workflow/caution';
import { registerFonts, runsOf } from './letter-fonts';

/** What the title block at the foot of every page says. */
export interface TitleBlock {
  application: string;
  subject: string;
  number: string;
  revision: string;
  voltages: string;
  filed: string;
  reviewer: string;
  state: string;
}

const MM = 72 / 25.4;
const PAGE = { width: 595.28, height: 841.89 };
/** 20 mm from the left edge, 10 mm from the others. */
const FRAME = { left: 20 * MM, top: 10 * MM, right: PAGE.width - 10 * MM, bottom: PAGE.height - 10 * MM };
const BLOCK_HEIGHT = 54;
const CAUTION_HEIGHT = 40;
const INSET = 18;
const FOOT = FRAME.bottom - BLOCK_HEIGHT - CAUTION_HEIGHT - 3 * 6;

export const TEXT = { left: FRAME.left + INSET, right: FRAME.right - INSET, top: FRAME.top + INSET };
const WIDTH = TEXT.right - TEXT.left;

interface Style {
  size?: number;
  strong?: boolean;
  colour?: ColourToken;
  left?: number;
  width?: number;
  align?: 'left' | 'right';
}

/** A letter being written: text flows down the sheet, and every page has the frame, the caution and the title block. */
export class LetterSheet {
  private readonly document: PDFKit.PDFDocument;
  private readonly chunks: Buffer[] = [];
  private readonly ended: Promise<void>;
  private readonly widths = new Map<string, number>();
  private y = TEXT.top;

  constructor(title: string, createdAt: Date) {
    this.document = new PDFDocument({
      size: 'A4',
      margin: 0,
      bufferPages: true,
      lang: 'en',
      info: { Title: title, Producer: 'Counterpoise', Creator: 'Counterpoise', CreationDate: createdAt },
    });
    this.document.on('data', (chunk: Buffer) => this.chunks.push(chunk));
    this.ended = new Promise((resolve, reject) => {
      this.document.on('end', resolve).on('error', reject);
    });
    registerFonts(this.document);
  }

  space(points: number): void {
    this.y += points;
  }

  /** Starts another page when so many points do not fit any more. */
  need(points: number): void {
    if (this.y + points <= FOOT) return;
    this.document.addPage();
    this.y = TEXT.top;
  }

  rule(colour: ColourToken = 'rule-strong'): void {
    this.document.moveTo(TEXT.left, this.y).lineTo(TEXT.right, this.y).lineWidth(0.75).stroke(LIGHT[colour]);
  }

  /** A paragraph below what stands there; a long one goes on over the page. */
  paragraph(text: string, style: Style = {}): void {
    const { size = 10, left = TEXT.left, width = WIDTH - (left - TEXT.left) } = style;
    for (const line of this.wrapped(text, width, size, style.strong === true)) {
      this.need(size * 1.45);
      this.line(line, left, this.y, { ...style, size, width });
      this.y += size * 1.45;
    }
  }

  /** A text beside the flow, on the line that comes next. */
  beside(text: string, left: number, style: Style = {}): void {
    this.line(text, left, this.y, { size: 10, ...style });
  }

  /** A grade's own shape, so that it is never told by colour alone. */
  gradeMark(grade: string | null, left: number): void {
    const { document, y } = this;
    const middle = y + 6;
    if (grade === 'must-answer') document.rect(left, middle - 4, 8, 8).fill(LIGHT.vermilion);
    else if (grade === 'explain') {
      const points: [number, number][] = [
        [left + 4, middle - 5],
        [left + 9, middle],
        [left + 4, middle + 5],
        [left - 1, middle],
      ];
      document.polygon(...points).fill(LIGHT.ochre);
    } else
      document
        .circle(left + 4, middle, 3.5)
        .lineWidth(1.2)
        .stroke(LIGHT.steel);
  }

  /** Draws what every page carries and ends the document. */
  async finish(block: TitleBlock): Promise<Buffer> {
    const { count } = this.document.bufferedPageRange();
    for (let page = 0; page < count; page++) {
      this.document.switchToPage(page);
      this.frame();
      this.caution();
      this.titleBlock(block, `${page + 1} / ${count}`);
    }
    this.document.end();
    await this.ended;
    return Buffer.concat(this.chunks);
  }

  private widthOf(text: string, size: number, strong: boolean): number {
    const key = `${size} ${strong} ${text}`;
    const known = this.widths.get(key);
    if (known !== undefined) return known;
    const width = runsOf(this.document, text, strong ? 'strong' : 'regular').reduce(
      (sum, run) => sum + this.document.font(run.font).fontSize(size).widthOfString(run.text),
      0,
    );
    this.widths.set(key, width);
    return width;
  }

  /** Lines of a text; words are measured one by one, since laying out ever longer lines takes long. */
  private wrapped(text: string, width: number, size: number, strong: boolean): string[] {
    const blank = this.widthOf(' ', size, strong);
    return text.split('\n').flatMap((paragraph) => {
      const lines: string[] = [];
      let line = '';
      let used = 0;
      for (const word of paragraph.split(' ').flatMap((w) => this.fitting(w, width, size, strong))) {
        const own = this.widthOf(word, size, strong);
        const fits = line === '' || used + blank + own <= width;
        if (!fits) lines.push(line);
        line = line === '' || !fits ? word : `${line} ${word}`;
        used = line === word ? own : used + blank + own;
      }
      return [...lines, line];
    });
  }

  /** A word that is wider than the column is cut, so that nothing runs out of the frame. */
  private fitting(word: string, width: number, size: number, strong: boolean): string[] {
    if (this.widthOf(word, size, strong) <= width) return [word];
    const half = Math.ceil(word.length / 2);
    return [word.slice(0, half), word.slice(half)].flatMap((part) =>
      part.length > 1 ? this.fitting(part, width, size, strong) : [part],
    );
  }

  private line(text: string, left: number, top: number, style: Style): void {
    const { size = 10, strong = false, colour = 'ink', align = 'left', width = WIDTH } = style;
    let x = align === 'right' ? left + width - this.widthOf(text, size, strong) : left;
    for (const run of runsOf(this.document, text, strong ? 'strong' : 'regular')) {
      this.document.font(run.font).fontSize(size).fillColor(LIGHT[colour]);
      this.document.text(run.text, x, top, { lineBreak: false });
      x += this.document.widthOfString(run.text);
    }
  }

  private frame(): void {
    const { left, top, right, bottom } = FRAME;
    this.document
      .rect(left, top, right - left, bottom - top)
      .lineWidth(1.5)
      .stroke(LIGHT.ink);
  }

  private caution(): void {
    const top = FRAME.bottom - BLOCK_HEIGHT - CAUTION_HEIGHT - 6;
    this.document.rect(TEXT.left, top, WIDTH, CAUTION_HEIGHT).lineWidth(0.75).stroke(LIGHT.ink);
    const lines = this.wrapped(`Caution. ${CAUTION}`, WIDTH - 16, 8, false);
    lines.forEach((line, i) => this.line(line, TEXT.left + 8, top + 7 + i * 11.5, { size: 8 }));
  }

  private titleBlock(block: TitleBlock, page: string): void {
    const top = FRAME.bottom - BLOCK_HEIGHT;
    const unit = (FRAME.right - FRAME.left) / 12;
    const cell = (column: number, span: number, row: number, label: string, value: string) => {
      const left = FRAME.left + column * unit;
      const y = top + row * (BLOCK_HEIGHT / 2);
      this.document
        .rect(left, y, span * unit, BLOCK_HEIGHT / 2)
        .lineWidth(0.75)
        .stroke(LIGHT['rule-strong']);
      this.line(label, left + 5, y + 4, { size: 7, colour: 'ink-soft' });
      const [first = ''] = this.wrapped(value, span * unit - 10, 9, true);
      this.line(first, left + 5, y + 13, { size: 9, strong: true });
    };
    cell(2, 4, 0, 'Application', block.application);
    cell(6, 3, 0, 'Subject', block.subject);
    cell(9, 2, 0, 'Number', block.number);
    cell(11, 1, 0, 'Revision', block.revision);
    cell(2, 2, 1, 'Voltages', block.voltages);
    cell(4, 2, 1, 'Filed', block.filed);
    cell(6, 3, 1, 'Reviewer', block.reviewer);
    cell(9, 2, 1, 'State', block.state);
    cell(11, 1, 1, 'Page', page);
    this.mark(FRAME.left + 10, top + 8);
    this.line('counterpoise', FRAME.left + 10, top + 36, { size: 9, strong: true });
    const width = FRAME.right - FRAME.left;
    this.document.rect(FRAME.left, top, width, BLOCK_HEIGHT).lineWidth(1.5).stroke(LIGHT.ink);
  }

  private mark(left: number, top: number): void {
    const { document } = this;
    const scale = 24 / MARK_BOX.height;
    document.save().translate(left, top).scale(scale);
    for (const stroke of MARK_STROKES) {
      document.path(stroke).lineWidth(MARK_STROKE_WIDTH).lineCap('round').stroke(LIGHT.ink);
    }
    for (const { x, y, radius, colour } of MARK_DISCS) document.circle(x, y, radius).fill(LIGHT[colour]);
    document.restore();
  }
}
