import { useCaseWrite } from '../../../lib/queries/use-case-write';

/** Takes the filed application for oneself. */
export const useTakeApplication = (number: string) => useCaseWrite('takeApplication', number);
