import type { Mode } from '../../../../shared/building/curvature-runs.ts';

/** What a zone is filled with; `prefix` is the one that its ZonePatterns has. */
export function zoneFill(prefix: string, mode: Mode): string {
  return `url(#${prefix}-${mode})`;
}

const LOOKS = {
  sagging: { path: 'M0 3H6', ground: 'var(--select-wash)', stroke: 'var(--contour)' },
  hogging: { path: 'M3 0V6', ground: 'var(--clay-wash)', stroke: 'var(--clay-line)' },
} as const satisfies Record<Mode, object>;

/** Sagging lies in level lines, hogging stands in upright ones: neither is a hatch of damage. */
export function ZonePatterns({ prefix }: { readonly prefix: string }) {
  return (
    <defs>
      {(['sagging', 'hogging'] as const).map((mode) => (
        <pattern
          key={mode}
          id={`${prefix}-${mode}`}
          width="6"
          height="6"
          patternUnits="userSpaceOnUse"
        >
          <rect width="6" height="6" fill={LOOKS[mode].ground} fillOpacity=".55" />
          <path
            d={LOOKS[mode].path}
            stroke={LOOKS[mode].stroke}
            strokeWidth=".6"
            strokeOpacity=".45"
          />
        </pattern>
      ))}
    </defs>
  );
}
