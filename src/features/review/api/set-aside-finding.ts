import { useCaseWrite } from '../../../lib/queries/use-case-write';

/** Sets a Note or an Explain aside. */
export const useSetAsideFinding = (number: string) => useCaseWrite('setAsideFinding', number);
