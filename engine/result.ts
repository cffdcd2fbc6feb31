/** How the engine refuses input: a value, never a throw. */

/** A success with its value, or a refusal with its fault. */
export type Result<T, F> = { readonly ok: true; readonly value: T } | { readonly ok: false; readonly fault: F };

/** A success. */
export function ok<T>(value: T): { readonly ok: true; readonly value: T } {
  return { ok: true, value };
}

/** A refusal. */
export function fail<F>(fault: F): { readonly ok: false; readonly fault: F } {
  return { ok: false, fault };
}
