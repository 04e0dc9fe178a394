/** A finding's message in two parts: what it says, and the figures behind it. */
export interface FindingSentence {
  says: string;
  detail: string | null;
}

/** Splits a message where its first statement ends: at the colon before its figures, or at the full stop. */
export function splitMessage(message: string): FindingSentence {
  const at = message.search(/: |\. (?=[A-Z])/);
  if (at < 0) return { says: message, detail: null };
  const says = `${message.slice(0, at)}.`;
  const rest = message.slice(at + 2).trim();
  return { says, detail: rest === '' ? null : rest.charAt(0).toUpperCase() + rest.slice(1) };
}

/** What a finding says, strong; its figures under it in a softer voice. */
export function FindingSays({ message }: { message: string }) {
  const { says, detail } = splitMessage(message);
  return (
    <>
      {says}
      {detail && <span className="block font-normal text-ink-soft">{detail}</span>}
    </>
  );
}
