/** An expected outcome: a value, or a failure the caller must handle. Bugs are thrown instead. */
export type Result<T, E> = { readonly ok: true; readonly value: T } | { readonly ok: false; readonly error: E };

export const ok = <T>(value: T): { readonly ok: true; readonly value: T } => ({ ok: true, value });
export const fail = <E>(error: E): { readonly ok: false; readonly error: E } => ({ ok: false, error });

/** The value of a result that cannot fail here; throws (a bug) when it did. */
export function expectOk<T, E>(result: Result<T, E>): T {
  if (result.ok) return result.value;
  throw new Error(`unexpected failure: ${JSON.stringify(result.error)}`);
}
