import { useMemo, useState } from 'react';
import { useForm, useWatch } from 'react-hook-form';
import type { AlignmentDesign, Shafts } from '../../../../shared/schemas/alignments.ts';
import {
  BLANK_OPTION,
  checkWith,
  designIfWhole,
  shaftsIfWhole,
  type OptionDraft,
} from '../drafts/option-draft.ts';

type Whole = { name: string; design: AlignmentDesign; shafts: Shafts };

/** The values of an option as they are written, and the design that they make with a line that is drawn. */
export function useWrittenOption(points: AlignmentDesign['line']) {
  const form = useForm<OptionDraft, unknown, Whole>({
    resolver: checkWith(points),
    defaultValues: BLANK_OPTION,
  });
  const written = useWatch({ control: form.control, compute: (draft: OptionDraft) => draft });
  const [kept, keep] = useState<AlignmentDesign | null>(null);
  const whole = useMemo(() => designIfWhole(written, points), [written, points]);
  const shafts = useMemo(() => shaftsIfWhole(written) ?? [], [written]);
  // what makes no design for a moment leaves the last one to be seen
  if (whole !== null && whole !== kept) keep(whole);
  return {
    form,
    design: whole ?? kept,
    shafts,
    begin: (draft: OptionDraft) => {
      keep(null);
      form.reset(draft);
    },
  };
}
