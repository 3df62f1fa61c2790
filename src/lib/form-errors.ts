import type { FieldValues, Path, UseFormSetError } from 'react-hook-form';
import { ApiError } from './api';

/** The one sentence for people in whatever a request failed with. */
export const sentenceOf = (error: unknown): string =>
  error instanceof ApiError ? error.detail : 'Something slipped on our side. Nothing was changed; try again.';

/**
 * Puts the server's complaints about single fields beside those fields.
 *
 * @returns the sentence to show over the form, or null when every complaint found its field.
 */
export function showErrors<T extends FieldValues>(error: unknown, names: readonly Path<T>[], setError: UseFormSetError<T>): string | null {
  if (!(error instanceof ApiError) || error.code !== 'invalid-input') return sentenceOf(error);
  const placed = error.fields.filter(({ path }) => names.includes(path as Path<T>));
  for (const { path, message } of placed) setError(path as Path<T>, { message });
  return placed.length > 0 && placed.length === error.fields.length ? null : error.detail;
}
