import { useId } from 'react';
import { ROW_LOOKS } from '../../map/style/row-looks.ts';
import type { Outcome } from '../outcomes.ts';

const STROKES = { strokes: 'M-1 1 1-1M0 8 8 0M7 9 9 7', crossed: 'M0 8 8 0M0 0 8 8' } as const;

/** How a row is drawn on the map, beside its word. */
export function OutcomeSwatch({ outcome }: { readonly outcome: Outcome }) {
  const id = useId();
  const { fill, opacity, edge, width, dashes, hatch } = ROW_LOOKS[outcome];
  const box = { x: 1.5, y: 1.5, width: 17, height: 10 };
  return (
    <svg width="20" height="13" viewBox="0 0 20 13" aria-hidden="true" className="flex-none">
      {hatch !== undefined && (
        <pattern id={id} width="8" height="8" patternUnits="userSpaceOnUse">
          <path d={STROKES[hatch]} stroke={edge} strokeWidth="0.9" fill="none" />
        </pattern>
      )}
      <rect {...box} fill={fill} fillOpacity={opacity} />
      {hatch !== undefined && <rect {...box} fill={`url(#${id})`} />}
      <rect
        {...box}
        fill="none"
        stroke={edge}
        strokeWidth={Math.min(width, 1.6)}
        strokeDasharray={dashes?.join(' ')}
      />
    </svg>
  );
}
