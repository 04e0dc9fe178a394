import { fieldWords } from '#shared/contracts/field-words';

/** A place within a line, in words: "section 1, position 2, height" instead of "/sections/0/positions/1/…". */
export function placeWords(pointer: string): string {
  const parts = pointer.split('/').slice(1);
  const words: string[] = [];
  for (let i = 0; i < parts.length; i += 1) {
    const part = parts[i] ?? '';
    const next = parts[i + 1];
    if (next !== undefined && /^\d+$/.test(next)) {
      words.push(`${singular(part)} ${Number(next) + 1}`);
      i += 1;
    } else if (part !== 'value' || i === 0) {
      words.push(lowered(fieldWords(part).label));
    }
  }
  const text = words.join(', ');
  return text === '' ? 'The whole line' : text.charAt(0).toUpperCase() + text.slice(1);
}

/** Within a sentence: "height", but "X1" and "GMR". */
const lowered = (label: string) =>
  /^[A-Z][a-z]/.test(label) ? label.charAt(0).toLowerCase() + label.slice(1) : label;

const SINGULAR: Readonly<Record<string, string>> = {
  sections: 'section',
  positions: 'position',
  declared: 'declared circuit',
  declaredMutual: 'declared coupling',
  perLength: 'cable circuit',
  ratings: 'rating',
};

const singular = (name: string) => SINGULAR[name] ?? name;

/** A value of a filing as people read it; what was not there says so. */
export function valueWords(value: unknown): string {
  if (value === undefined || value === null) return 'not given';
  if (typeof value === 'number') return String(Number(value.toPrecision(12))).replace('-', '\u2212');
  if (typeof value === 'string') return value;
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  return JSON.stringify(value);
}
