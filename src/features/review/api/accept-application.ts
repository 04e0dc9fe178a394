import { useCaseWrite } from '../../../lib/queries/use-case-write';

/** Accepts the current revision. */
export const useAcceptApplication = (number: string) => useCaseWrite('acceptApplication', number);
