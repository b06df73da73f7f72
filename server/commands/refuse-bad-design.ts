import { drivesOfDesign } from '../../shared/assessment/drives-of-design.ts';
import { MethodError } from '../../shared/method-error.ts';
import type { AlignmentDesign } from '../../shared/schemas/alignments.ts';
import { AppError } from '../errors.ts';

/** Does something with what was sent at a place, and refuses it at the field in it that is at fault. */
export function refusingBadValues(place: string, work: () => unknown): void {
  try {
    work();
  } catch (error) {
    if (!(error instanceof MethodError)) throw error;
    const { message, field } = error;
    const path = field === undefined ? place : `${place}.${field}`;
    throw new AppError('invalid-input', message, [{ path, message }]);
  }
}

/** Does something with a design, and refuses it at the place in it that is at fault. */
export function refusingBadDesign(work: () => unknown): void {
  refusingBadValues('design', work);
}

/** Refuses a design whose bores cannot follow its line. */
export function refuseBadDesign(design: AlignmentDesign): void {
  refusingBadDesign(() => drivesOfDesign(design));
}
