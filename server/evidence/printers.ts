import type { EvidenceLayout } from '../../shared/schemas/evidence.ts';
import { AppError } from '../errors.ts';
import { printDrawn } from './print-drawn.ts';
import type { Printer } from './printing.ts';

const NO_SCHEDULE = 'Schedules cannot be printed yet.';

/** Refuses what there is no way to print of. */
export function refuseUnprintable({ kind }: EvidenceLayout): void {
  if (kind !== 'schedule') return;
  throw new AppError('invalid-input', NO_SCHEDULE, [{ path: 'layout.kind', message: NO_SCHEDULE }]);
}

/** How each kind of layout is printed. */
export const PRINTERS: Readonly<Record<EvidenceLayout['kind'], Printer>> = {
  plan: printDrawn,
  strip: printDrawn,
  sections: printDrawn,
  schedule: () => Promise.reject(new AppError('invalid-input', NO_SCHEDULE)),
};
