import type { Failure, FailureReason, Success, Where } from './types';

/**
 * A typed failure.
 *
 * @param reason kind of fault
 * @param where place in the input, indices from 0
 * @param detail one sentence: what is there and what is wanted
 * @param condition estimate of the condition number, where that is the fault
 */
export function fail(reason: FailureReason, where: Where, detail: string, condition?: number): Failure {
  return condition === undefined
    ? { ok: false, reason, where, detail }
    : { ok: false, reason, where, detail, condition };
}

/** A success around a value. */
export function succeed<T>(value: T): Success<T> {
  return { ok: true, value };
}

/** The same failure, told for the section with the given index. */
export function inSection(failure: Failure, section: number): Failure {
  return { ...failure, where: { section, ...failure.where } };
}
