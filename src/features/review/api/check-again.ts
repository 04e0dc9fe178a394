import { useCaseWrite } from '../../../lib/queries/use-case-write';

/** Asks for another check run of a revision. */
export const useCheckAgain = (number: string) => useCaseWrite('checkAgain', number);
