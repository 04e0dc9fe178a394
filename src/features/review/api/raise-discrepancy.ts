import { useCaseWrite } from '../../../lib/queries/use-case-write';

/** Raises a discrepancy from findings or by hand. */
export const useRaiseDiscrepancy = (number: string) => useCaseWrite('raiseDiscrepancy', number);
