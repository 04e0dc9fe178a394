import { createContext, useContext, useMemo, useState } from 'react';
import type { Back } from '../model/take-back';

/** Something that one press took away, and how it comes back. */
export interface Taken {
  /** The part of the form that took it: the offer stands there. */
  at: string;
  /** What is gone: "Section 2 is removed." */
  words: string;
  back: Back;
  /** Where the reader is once it is settled. */
  focusId: string;
  /** Where the reader is once it has come back, where that is elsewhere. */
  backFocusId?: string;
  /** Called when it comes back, before the focus goes on. */
  onBack?: () => void;
}

export interface TakeBack {
  taken: Taken | null;
  /** Offers to take the last step back; an older offer ends. */
  offer: (taken: Taken) => void;
  end: () => void;
}

const NOWHERE: TakeBack = { taken: null, offer: () => undefined, end: () => undefined };

export const TakeBackContext = createContext<TakeBack>(NOWHERE);

export const useTakeBack = (): TakeBack => useContext(TakeBackContext);

/** The last thing that one press took away, until it is settled. */
export function useTakenBack(): TakeBack {
  const [taken, setTaken] = useState<Taken | null>(null);
  return useMemo(() => ({ taken, offer: setTaken, end: () => setTaken(null) }), [taken]);
}
