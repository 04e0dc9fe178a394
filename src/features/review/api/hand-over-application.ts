import { useCaseWrite } from '../../../lib/queries/use-case-write';

/** Hands the case to another reviewer. */
export const useHandOverApplication = (number: string) => useCaseWrite('handOverApplication', number);
