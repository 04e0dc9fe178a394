import { useCaseWrite } from '../../../lib/queries/use-case-write';

/** Proposes to decline; a second reviewer countersigns. */
export const useDeclineApplication = (number: string) => useCaseWrite('declineApplication', number);
