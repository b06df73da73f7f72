import { numberOf } from '../../../lib/number-of.ts';
import {
  forEachFigure,
  WHAT_IF_FIELDS,
  WHAT_IF_NAMES,
  type WhatIfDraft,
  type WhatIfFaults,
  type WhatIfField,
  type WhatIfInputs,
  type WhatIfName,
} from './what-if-fields.ts';

/** The fields read, or what is wrong with them. */
export type ReadInputs =
  | { readonly kind: 'inputs'; readonly inputs: WhatIfInputs }
  | { readonly kind: 'faults'; readonly faults: WhatIfFaults };

function withUnit(figure: number, unit: string): string {
  const words = String(figure).replace('-', '\u2212');
  return unit === '' ? words : `${words}\u00a0${unit}`;
}

function faultOf(text: string, { least, most, isOver = false, unit }: WhatIfField): string | null {
  const value = numberOf(text);
  if (value === null) return text.trim() === '' ? 'A figure is missing.' : 'This is no number.';
  if (value > most) return `At most ${withUnit(most, unit)}.`;
  if (isOver && value <= least) return `More than ${withUnit(least, unit)}.`;
  return value < least ? `At least ${withUnit(least, unit)}.` : null;
}

const RANGES = [
  ['lossLow', 'lossCentral', 'lossHigh'],
  ['widthLow', 'widthCentral', 'widthHigh'],
] as const;

/** Faults of a range whose figures are numbers but not in order. */
function orderFaults(inputs: WhatIfInputs): WhatIfFaults {
  const faults: Partial<Record<WhatIfName, string>> = {};
  for (const [low, central, high] of RANGES) {
    if (inputs[low] > inputs[central]) faults[low] = 'Not over the central value.';
    if (inputs[high] < inputs[central]) faults[high] = 'Not under the central value.';
  }
  return faults;
}

/** Reads what is written in the fields. */
export function readInputs(draft: WhatIfDraft): ReadInputs {
  const faults: Partial<Record<WhatIfName, string>> = {};
  for (const name of WHAT_IF_NAMES) {
    const fault = faultOf(draft[name], WHAT_IF_FIELDS[name]);
    if (fault !== null) faults[name] = fault;
  }
  if (Object.keys(faults).length > 0) return { kind: 'faults', faults };
  const inputs = forEachFigure((name) => numberOf(draft[name]) ?? NaN);
  const outOfOrder = orderFaults(inputs);
  return Object.keys(outOfOrder).length > 0
    ? { kind: 'faults', faults: outOfOrder }
    : { kind: 'inputs', inputs };
}
