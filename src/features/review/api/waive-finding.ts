import { useCaseWrite } from '../../../lib/queries/use-case-write';

/** Waives a finding; a Must answer waits for a second reviewer. */
export const useWaiveFinding = (number: string) => useCaseWrite('waiveFinding', number);
