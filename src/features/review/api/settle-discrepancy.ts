import { useCaseWrite } from '../../../lib/queries/use-case-write';

/** Settles a discrepancy on the revision that was read. */
export const useSettleDiscrepancy = (number: string) => useCaseWrite('settleDiscrepancy', number);
