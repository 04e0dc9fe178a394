import { useCaseWrite } from '../../../lib/queries/use-case-write';

/** Puts the case back into the queue. */
export const usePutBackApplication = (number: string) => useCaseWrite('putBackApplication', number);
