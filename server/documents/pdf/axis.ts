import type { Scale } from '../../../shared/presentation/linear-scale.ts';
import { INKS } from './inks.ts';
import { label } from './label.ts';
import type { Paper } from './paper.ts';
import { drawLine } from './trace.ts';

type Axis = {
  readonly scale: Scale;
  readonly ticks: readonly number[];
  /** Where the axis stands: from the top for one that lies, from the left for one that stands. */
  readonly at: number;
  readonly words?: (tick: number) => string;
};

const LOOK = { size: 10, ink: INKS.second };

function plain(tick: number): string {
  return String(tick).replace('-', '\u2212');
}

/** The ticks under a drawing. */
export function bottomAxis(paper: Paper, { scale, ticks, at, words = plain }: Axis): void {
  for (const tick of ticks) {
    drawLine(paper, [[scale(tick), at], [scale(tick), at + 4]], { ink: INKS.ink }); // prettier-ignore
    label(paper, words(tick), scale(tick), at + 15, { ...LOOK, anchor: 'middle' });
  }
}

/** The ticks at the left of a drawing, with hairlines across it where a width is given. */
export function leftAxis(
  paper: Paper,
  { scale, ticks, at, words = plain, across = 0 }: Axis & { readonly across?: number },
): void {
  for (const tick of ticks) {
    const ink = across === 0 ? INKS.ink : INKS.hairline;
    const end = across === 0 ? at - 4 : at + across;
    drawLine(paper, [[at, scale(tick)], [end, scale(tick)]], { ink }); // prettier-ignore
    label(paper, words(tick), at - 7, scale(tick) + 3.5, { ...LOOK, anchor: 'end' });
  }
}
