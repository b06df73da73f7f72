import { chainages } from '../../shared/geometry/chainages.ts';
import type { AlignmentDesign } from '../../shared/schemas/alignments.ts';
import { percentFromRatio } from '../../shared/units/percent-from-ratio.ts';
import type { BesideSheet, ExportAbout, SheetColumn } from './export-file.ts';

const ENDS = ['low', 'central', 'high'] as const;

function boreLines({ bores }: AlignmentDesign): ExportAbout {
  if (bores.kind === 'single') return [['Drives', 'one']];
  return [
    ['Drives', 'two, on either side of the line'],
    ['Distance between the drives (m)', bores.spacing],
    ['Later drive', `${bores.later} of the line as drawn`],
    ['Factor on its volume loss', bores.laterFactor],
  ];
}

/** What a run took of the option that it worked through, figure by figure. */
export function aboutDesign(design: AlignmentDesign): ExportAbout {
  const { diameter, direction, groundLevel, volumeLoss, troughWidth } = design;
  return [
    ['Excavated diameter (m)', diameter],
    ...boreLines(design),
    ['Direction of driving', direction === 'forward' ? 'as drawn' : 'against the line'],
    ['Ground level where none is known (m)', groundLevel],
    ...ENDS.map((end) => [`Volume loss, ${end} (%)`, percentFromRatio(volumeLoss[end])] as const),
    ...ENDS.map((end) => [`Trough width K, ${end}`, troughWidth[end]] as const),
  ];
}

function columns(...headings: readonly string[]): readonly SheetColumn[] {
  return headings.map((heading) => ({ heading, kind: 'number' }));
}

/** The line in plan, the levels of the axis, and where the ground losses are others. */
export function sheetsOfDesign({ line, levels, intervals }: AlignmentDesign): BesideSheet[] {
  const along = chainages(line);
  const losses = ENDS.map((end) => `Volume loss ${end} (%)`);
  const widths = ENDS.map((end) => `K ${end}`);
  return [
    {
      title: 'Line',
      columns: columns('Chainage (m)', 'Easting (m)', 'Northing (m)'),
      rows: line.map(([east, north], k) => [along[k] ?? 0, east, north]),
    },
    {
      title: 'Levels',
      columns: columns('Chainage (m)', 'Level of the axis (m)'),
      rows: levels.map(({ chainage, level }) => [chainage, level]),
    },
    {
      title: 'Intervals',
      columns: columns('From (m)', 'To (m)', ...losses, ...widths),
      rows: intervals.map(({ from, to, volumeLoss, troughWidth }) => [
        ...[from, to],
        ...ENDS.map((end) => percentFromRatio(volumeLoss[end])),
        ...ENDS.map((end) => troughWidth[end]),
      ]),
    },
  ];
}
