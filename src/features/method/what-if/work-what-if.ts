import { modelOfCase, wallOfCase } from '../../../../shared/assessment/model-of-case.ts';
import { openWall, type OpenedWall } from '../../../../shared/assessment/open-wall.ts';
import { MethodError } from '../../../../shared/method-error.ts';
import type { Range } from '../../../../shared/numerics/range.ts';
import type { AssessCase } from '../../../../shared/schemas/assess-case.ts';
import { caseOfInputs } from './case-of-inputs.ts';
import { readInputs } from './read-inputs.ts';
import type { WhatIfDraft, WhatIfFaults, WhatIfInputs } from './what-if-fields.ts';

/** A what-if worked out, with the case it was worked out from. */
export type WorkedWhatIf = {
  readonly kind: 'worked';
  readonly opened: OpenedWall;
  readonly asked: AssessCase;
  readonly volumeLoss: Range;
  readonly troughWidth: Range;
};

/** What the fields lead to: an opened wall, or what is wrong and where. */
export type WhatIfAnswer =
  WorkedWhatIf | { readonly kind: 'faults'; readonly faults: WhatIfFaults };

function refusalOf(error: MethodError, { axisDepth, diameter }: WhatIfInputs): WhatIfFaults {
  switch (error.code) {
    case 'below-crown-beside-drive': {
      const crown = axisDepth - diameter / 2;
      if (crown <= 0) return { axisDepth: 'The crown of the drive is above ground.' };
      return {
        founding: `The crown of the drive is ${Number(crown.toFixed(2))}\u00a0m below ground. The wall has to be founded above it.`,
      };
    }
    case 'trough-width-not-positive':
      return { widthLow: 'This K gives no trough width at the depth where the wall is founded.' };
    case 'no-sign-change':
    case 'zero-length':
    case 'founding-above-ground':
    case 'bad-intervals':
    case 'bad-range':
    case 'bad-table':
    case 'outside-range':
      return { founding: error.message };
  }
}

function worked(inputs: WhatIfInputs): WhatIfAnswer {
  const asked = caseOfInputs(inputs);
  const { model, rules, faces, groundLevel } = modelOfCase(asked);
  const [wall] = asked.walls;
  const [drive] = model.drives;
  if (wall === undefined || drive === undefined) return { kind: 'faults', faults: {} };
  const opened = openWall(model, wallOfCase(wall, groundLevel), rules, faces);
  const { volumeLoss, troughWidth } = drive;
  return { kind: 'worked', opened, asked, volumeLoss, troughWidth };
}

/** Works a what-if out by the functions that work everything out. */
export function workWhatIf(draft: WhatIfDraft): WhatIfAnswer {
  const read = readInputs(draft);
  if (read.kind === 'faults') return read;
  try {
    return worked(read.inputs);
  } catch (error) {
    if (!(error instanceof MethodError)) throw error;
    return { kind: 'faults', faults: refusalOf(error, read.inputs) };
  }
}
