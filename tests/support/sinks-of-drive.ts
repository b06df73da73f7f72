import type { SinkDrive } from './point-sinks.ts';
import { pathAlong, type SinkPath } from './sink-path.ts';

/** Low, central and high of an input, in the shape in which drives carry them. */
type Three = { readonly low: number; readonly central: number; readonly high: number };

/** What the quadrature reads of a drive: plain data, so that no code of shared/ is needed. */
export type DriveData = {
  readonly axis: readonly (readonly [number, number, number])[];
  readonly diameter: number;
  readonly volumeLoss: Three;
  readonly troughWidth: Three;
  readonly intervals: readonly {
    readonly from: number;
    readonly to: number;
    readonly diameter?: number;
    readonly volumeLoss?: Three;
    readonly troughWidth?: Three;
  }[];
  readonly faceShare: number;
  readonly laterFactor: number;
};

/**
 * A drive as sinks, along its own axis or along another curve of the same chainages, with its face at
 * a chainage, V_L and K at one end of their ranges.
 */
export function sinksOfDrive(
  drive: DriveData,
  {
    path,
    face,
    V_L = 'central',
    K = 'central',
  }: {
    readonly path?: SinkPath;
    readonly face?: number | undefined;
    readonly V_L?: keyof Three;
    readonly K?: keyof Three;
  } = {},
): SinkDrive {
  const own = path ?? pathAlong(drive.axis);
  function intervalAt(s: number) {
    return drive.intervals.find(({ from, to }) => s >= from && s < to);
  }
  const ends = drive.intervals.flatMap(({ from, to }) => [from, to]);
  const breaks = [...own.breaks, ...ends.filter((s) => s > 0 && s < own.length)];
  return {
    path: { ...own, breaks: [...new Set(breaks)].sort((a, b) => a - b) },
    lossPerMetre: (s) => {
      const interval = intervalAt(s);
      const D = interval?.diameter ?? drive.diameter;
      const loss = (interval?.volumeLoss ?? drive.volumeLoss)[V_L];
      return (drive.laterFactor * loss * Math.PI * D * D) / 4;
    },
    K: (s) => (intervalAt(s)?.troughWidth ?? drive.troughWidth)[K],
    face,
    share: drive.faceShare,
  };
}
