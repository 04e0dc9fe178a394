/** Conditions as they are typed, one a line, into the list that the decision keeps. */
export function conditionsOf(text: string): string[] {
  return text
    .split('\n')
    .map((line) => line.trim())
    .filter((line) => line !== '');
}
