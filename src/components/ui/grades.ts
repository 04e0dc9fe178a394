/** Grades as a check reports them, and the verdict of a value that has no finding. */
export type Grade = 'must-answer' | 'explain' | 'note' | 'in-balance';

export const GRADE_WORDS: Readonly<Record<Grade, string>> = {
  'must-answer': 'Must answer',
  explain: 'Explain',
  note: 'Note',
  'in-balance': 'In balance',
};

/** The three grades that findings have, worst first. */
export const FINDING_GRADES = ['must-answer', 'explain', 'note'] as const;

export type FindingGrade = (typeof FINDING_GRADES)[number];

/** Findings by grade; left out is none. */
export type GradeCounts = Readonly<Partial<Record<FindingGrade, number>>>;

/** The worst grade that occurs; in balance when none does. */
export function worstGrade(counts: GradeCounts): Grade {
  return FINDING_GRADES.find((grade) => (counts[grade] ?? 0) > 0) ?? 'in-balance';
}

/** So many findings of a grade: "1 note", "3 notes"; what must be answered or explained has no plural. */
export const countWords = (count: number, grade: FindingGrade): string =>
  `${count} ${grade === 'note' && count !== 1 ? 'notes' : GRADE_WORDS[grade].toLowerCase()}`;

/** Counts as words for a name: "1 must answer, 2 explain", or "In balance". */
export function gradeSentence(counts: GradeCounts): string {
  const parts = FINDING_GRADES.filter((grade) => (counts[grade] ?? 0) > 0).map((grade) =>
    countWords(counts[grade] ?? 0, grade),
  );
  return parts.length > 0 ? parts.join(', ') : GRADE_WORDS['in-balance'];
}
