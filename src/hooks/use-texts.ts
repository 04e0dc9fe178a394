import { useState } from 'react';

/** What is wanted of a field, or null where what stands in it will do. */
export type Wants<K extends string> = (texts: Readonly<Record<K, string>>) => Partial<Record<K, string>>;

/**
 * A small form of texts: what stands in its fields, and what is wrong with them. The form's own wishes are
 * said once somebody has tried to send it; the server's faults stand beside them.
 */
export function useTexts<K extends string>(
  initial: Readonly<Record<K, string>>,
  wants: Wants<K>,
  serverFaults: Readonly<Record<string, string>>,
) {
  const [texts, setTexts] = useState<Readonly<Record<K, string>>>(initial);
  const [tried, setTried] = useState(false);
  const wishes = wants(texts);
  const errorOf = (name: K): string | null =>
    (tried ? wishes[name] : undefined) ?? serverFaults[name] ?? null;
  return {
    texts,
    set: (name: K, text: string) => setTexts((before) => ({ ...before, [name]: text })),
    errorOf,
    /** What ties one field to the form. */
    field: (name: K) => ({
      value: texts[name],
      error: errorOf(name),
      onText: (text: string) => setTexts((before) => ({ ...before, [name]: text })),
    }),
    /** Says what is missing, or runs `send` when nothing is. */
    submit: (send: (texts: Readonly<Record<K, string>>) => void) => {
      setTried(true);
      if (Object.values(wishes).every((wish) => wish === undefined)) send(texts);
    },
  };
}
