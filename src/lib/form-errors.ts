import type { FieldPath, FieldValues, UseFormReturn } from 'react-hook-form';
import { ApiError } from './api-error.ts';

/**
 * Puts the faults that the server found beside the fields that the form has. What is left over is said
 * above the form.
 */
export function showFieldFaults<T extends FieldValues>(
  error: unknown,
  form: UseFormReturn<T, unknown, unknown>,
  fields: readonly FieldPath<T>[],
): void {
  if (!(error instanceof ApiError)) return;
  for (const field of fields) {
    const fault = error.fields.find(({ path }) => path === field);
    if (fault !== undefined) form.setError(field, { message: fault.message });
  }
}
