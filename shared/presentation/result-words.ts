import { LARGEST_VOLUME_LOSS } from '../assessment/breakpoint-of-wall.ts';
import type { RunResult } from '../schemas/runs.ts';
import { formatCount } from './format-number.ts';
import { percentWords } from './bracket-words.ts';

function share(reserve: number): string {
  return formatCount(Number(reserve.toFixed(2)));
}

/**
 * At which volume loss a building breaks, and how far that is from what is likely.
 *
 * Units: as RunResult. Valid: any recorded result. Source: [own].
 */
export function reserveWords(
  result: Pick<RunResult, 'breakpointVolumeLoss' | 'reserve' | 'reserveOverHigh'>,
): string {
  const { breakpointVolumeLoss: loss, reserve, reserveOverHigh } = result;
  if (loss === null || reserve === null || reserveOverHigh === null) {
    return `Holds up to a volume loss of ${percentWords(LARGEST_VOLUME_LOSS, 0)}.`;
  }
  const over = `${share(reserve)} over the central value, ${share(reserveOverHigh)} over the high`;
  return `Breaks at a volume loss of ${percentWords(loss, 2)}. Reserve ${over}.`;
}

/**
 * How far a building came, and why it is held where it is.
 *
 * Units: none. Valid: any recorded result. Source: [own].
 */
export function stageWords({ stage, heldBy }: Pick<RunResult, 'stage' | 'heldBy'>): string {
  if (stage < 3) return `Let go at stage ${stage}`;
  return heldBy.length === 0 ? 'Stage 3' : `Stage 3, held by ${heldBy.join(', ')}`;
}
