/** A domain outcome as a value: callers must look at `ok` before they read the rest. */
export type Result<T, E> = { ok: true; value: T } | { ok: false; error: E };

/** Wraps a value as a success. */
export const succeed = <T>(value: T): Result<T, never> => ({ ok: true, value });

/** Wraps an error value as a failure. */
export const fail = <E>(error: E): Result<never, E> => ({ ok: false, error });
