import type { EvidenceLayout, PlanContent } from '../../../shared/schemas/evidence.ts';

export const KINDS: readonly { value: EvidenceLayout['kind']; label: string }[] = [
  { value: 'plan', label: 'Plan' },
  { value: 'strip', label: 'Strip series' },
  { value: 'sections', label: 'Sections' },
  { value: 'schedule', label: 'Schedule' },
];

export const SHOWS: readonly { value: PlanContent['shows']; label: string }[] = [
  { value: 'low', label: 'Category, low' },
  { value: 'central', label: 'Category, central' },
  { value: 'high', label: 'Category, high' },
  { value: 'settlement', label: 'Settlement' },
  { value: 'stage', label: 'Stage' },
];

export const NAMES: readonly { value: PlanContent['names']; label: string }[] = [
  { value: 'references', label: 'References' },
  { value: 'addresses', label: 'Addresses' },
  { value: 'none', label: 'None' },
];

export const SCALES = ['500', '1250', '2500'] as const;

export const ROWS = [
  { value: 'affected', label: 'Those not let go at stage 1' },
  { value: 'all', label: 'All of the run' },
] as const;

/** The option of a list that somebody chose. */
export function chosen<T extends string>(
  options: readonly { readonly value: T }[],
  value: string,
): T | undefined {
  return options.find((one) => one.value === value)?.value;
}

const GROUP = 4;
const SHOWN = 16;

/** A fingerprint as it is compared by eye: its first digits in groups. */
export function shortFingerprint(fingerprint: string): string {
  const digits = fingerprint.slice(0, SHOWN);
  return digits.replaceAll(new RegExp(`(.{${GROUP}})(?=.)`, 'g'), '$1 ');
}

/** How large a file is. */
export function sizeWords(bytes: number): string {
  return bytes < 1e6
    ? `${Math.max(1, Math.round(bytes / 1e3))} kB`
    : `${(bytes / 1e6).toFixed(1)} MB`;
}
