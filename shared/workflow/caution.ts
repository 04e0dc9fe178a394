/** The caution on every report, letter and decision. */

/** What the check does not replace, in the words that stand on every page. */
export const CAUTION =
  'The check compares declared data with a calculation; it replaces no engineering study, no protection setting and no ' +
  'design check. Local codes, the owner’s rules and the judgement of licensed engineers govern.';
