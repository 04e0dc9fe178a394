import { useCaseWrite } from '../../../lib/queries/use-case-write';

/** Returns the case with its open discrepancies; the server sends the letter. */
export const useReturnApplication = (number: string) => useCaseWrite('returnApplication', number);
