import { pagesOfPdf } from './pdf-tools.ts';

/** The figures of a row of a printed schedule as they read; null stands for a dash. */
export type ScheduleLine = {
  readonly reference: string;
  readonly offset: string | null;
  readonly settlement: string | null;
  readonly slope: string | null;
  readonly strain: string | null;
  readonly categories: readonly (string | null)[];
  readonly breakpoint: string | null;
  readonly stage: string | null;
  readonly decision: string;
};

const FIGURE = String.raw`(\u2212?\d+\.\d+|–)`;
const PERCENT = String.raw`(\d+\.\d+\s%|–)`;
const CATEGORY = String.raw`(\d(?:–\d)?|–)`;
const LINE = new RegExp(
  String.raw`^\s*(\S+)\s+\S.*?\s+${FIGURE}\s+${FIGURE}\s+(1 in \d+|none|–)\s+${PERCENT}\s+${CATEGORY}\s+${CATEGORY}\s+${CATEGORY}\s+${PERCENT}\s+(\d)\s+(\S.*)$`,
  'u',
);

function known(text = ''): string | null {
  return text === '–' ? null : text.replace('\u2212', '-').replace(/\s%$/, '');
}

/** The rows of a printed schedule, each by its first line. */
export function scheduleLines(pdf: Uint8Array): ScheduleLine[] {
  const lines = pagesOfPdf(pdf).flatMap((page) => page.split('\n'));
  return lines.flatMap((line): ScheduleLine[] => {
    const found = LINE.exec(line);
    if (found === null) return [];
    const [, reference = '', offset, settlement, slope, strain, low, central, high, breakpoint, stage, decision = ''] = found; // prettier-ignore
    return [
      {
        ...{ reference, decision },
        ...{ offset: known(offset), settlement: known(settlement), slope: known(slope) },
        ...{ strain: known(strain), breakpoint: known(breakpoint), stage: known(stage) },
        categories: [known(low), known(central), known(high)],
      },
    ];
  });
}
