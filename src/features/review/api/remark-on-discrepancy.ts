import { useCaseWrite } from '../../../lib/queries/use-case-write';

/** Adds words to a thread. */
export const useRemarkOnDiscrepancy = (number: string) => useCaseWrite('remarkOnDiscrepancy', number);
