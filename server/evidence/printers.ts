import type { EvidenceLayout } from '../../shared/schemas/evidence.ts';
import { printDrawn } from './print-drawn.ts';
import { printSchedule } from './print-schedule.ts';
import type { Printer } from './printing.ts';

/** How each kind of layout is printed. */
export const PRINTERS: Readonly<Record<EvidenceLayout['kind'], Printer>> = {
  plan: printDrawn,
  strip: printDrawn,
  sections: printDrawn,
  schedule: printSchedule,
};
