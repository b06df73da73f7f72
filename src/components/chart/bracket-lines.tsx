import { pathBetween, pathOf, type Place } from './path-of.ts';
import { runsOf } from './runs-of.ts';

/** Low, central and high at one place of a drawing, in pixels. */
export type BracketPlace = {
  readonly x: number;
  readonly low: number;
  readonly central: number;
  readonly high: number;
};

function placesOf(run: readonly BracketPlace[], end: 'low' | 'central' | 'high'): Place[] {
  return run.map((place) => [place.x, place[end]]);
}

/** A value over its bracket: the band, its low edge dotted, its high edge dashed, the central line inked. */
export function BracketLines({ places }: { readonly places: readonly (BracketPlace | null)[] }) {
  return runsOf(places).map((run) => {
    const [low, high] = [placesOf(run, 'low'), placesOf(run, 'high')];
    return (
      <g key={run[0]?.x} className="fill-none">
        <path d={pathBetween(low, high)} className="fill-band opacity-75" />
        <path d={pathOf(low)} className="stroke-band-line" strokeDasharray="1 3" />
        <path d={pathOf(high)} className="stroke-band-line" strokeDasharray="5 3" />
        <path d={pathOf(placesOf(run, 'central'))} className="stroke-ink" strokeWidth="1.8" />
      </g>
    );
  });
}
