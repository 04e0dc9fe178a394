import { useCaseWrite } from '../../../lib/queries/use-case-write';

/** Asks again. */
export const useReopenDiscrepancy = (number: string) => useCaseWrite('reopenDiscrepancy', number);
