import { useCaseWrite } from '../../../lib/queries/use-case-write';

/** Makes a run govern. */
export const useAdoptRun = (number: string) => useCaseWrite('adoptRun', number);
