/**
 * Front door of the line-constants engine: plain data in, typed results out, never NaN, never an exception.
 * The rest of the product imports the engine from here only.
 */

/** Version of the engine's arithmetic, kept with every check run: it changes when any result can change. */
export const ENGINE_VERSION = '1.0.0';

export * from './types';
export { solveSection } from './section';
export { solveLine } from './line';
export { sectionMatrices } from './matrices';
export { sensitivities, uncertainty } from './uncertainty';
export * from './sensitivity-types';
