import type { FieldPath, FieldValues, UseFormReturn } from 'react-hook-form';
import { ApiError } from './api-error.ts';

/**
 * Puts the faults that the server found beside the fields that the form has, and the focus into the first
 * of them. What is left over is said above the form, and has the focus then.
 */
export function showFieldFaults<T extends FieldValues>(
  error: unknown,
  form: UseFormReturn<T, unknown, unknown>,
  fields: readonly FieldPath<T>[],
): void {
  if (!(error instanceof ApiError)) return;
  const faults = fields.flatMap((field) => {
    const fault = error.fields.find(({ path }) => path === field);
    return fault === undefined ? [] : [{ field, message: fault.message }];
  });
  for (const [index, { field, message }] of faults.entries()) {
    form.setError(field, { message }, { shouldFocus: index === 0 });
  }
}
