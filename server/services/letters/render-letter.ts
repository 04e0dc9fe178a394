import { LetterSheet, TEXT, type TitleBlock } from './letter-sheet';

/** A discrepancy as a letter states it. */
export interface LetterItem {
  label: string;
  grade: string | null;
  title: string;
  /** What was found, as sentences. */
  body: string[];
  /** What would settle it. */
  ask: string | null;
}

/** Everything that a letter says. */
export interface LetterContent {
  owner: string;
  applicant: string;
  contactName: string;
  date: string;
  heading: string;
  intro: string[];
  items: LetterItem[];
  closingHeading: string;
  closing: string[];
  signedBy: string;
  block: TitleBlock;
  createdAt: Date;
}

const GRADE_WORDS: Readonly<Record<string, string>> = {
  'must-answer': 'Must answer',
  explain: 'Explain',
  note: 'Note',
};

/** The letter as PDF. */
export async function renderLetter(content: LetterContent): Promise<Buffer> {
  const sheet = new LetterSheet(`${content.block.number}: ${content.heading}`, content.createdAt);
  addresses(sheet, content);
  sheet.paragraph(content.heading, { size: 15, strong: true });
  sheet.space(8);
  for (const text of content.intro) sheet.paragraph(text);
  sheet.space(10);
  for (const item of content.items) writeItem(sheet, item);
  if (content.items.length > 0) {
    sheet.rule();
    sheet.space(14);
  }
  sheet.need(60);
  sheet.paragraph(content.closingHeading, { strong: true });
  for (const text of content.closing) sheet.paragraph(text);
  sheet.space(18);
  sheet.need(32);
  sheet.paragraph(content.signedBy);
  sheet.paragraph(`For ${content.owner}`, { colour: 'ink-soft' });
  return sheet.finish(content.block);
}

function addresses(sheet: LetterSheet, content: LetterContent): void {
  sheet.beside(content.owner, TEXT.left, { size: 13, strong: true, align: 'right' });
  sheet.space(18);
  sheet.beside(content.date, TEXT.left, { strong: true, align: 'right' });
  sheet.paragraph(content.applicant, { width: 300 });
  sheet.paragraph(content.contactName, { width: 300 });
  sheet.space(30);
}

function writeItem(sheet: LetterSheet, item: LetterItem): void {
  sheet.need(70);
  sheet.rule();
  sheet.space(8);
  sheet.beside(item.label, TEXT.left, { strong: true });
  const left = TEXT.left + 42;
  if (item.grade !== null) {
    sheet.gradeMark(item.grade, left);
    sheet.beside(GRADE_WORDS[item.grade] ?? '', left + 14, { size: 9, strong: true, colour: 'ink-soft' });
  }
  sheet.paragraph(item.title, { strong: true, left: item.grade === null ? left : left + 78 });
  for (const text of item.body) sheet.paragraph(text, { left });
  if (item.ask !== null) sheet.paragraph(`We ask: ${item.ask}`, { left });
  sheet.space(8);
}
