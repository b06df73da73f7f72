import { useMemo, useState } from 'react';
import type { AlignmentAnswer } from '../../../../shared/schemas/alignments.ts';
import { showFieldFaults } from '../../../lib/form-errors.ts';
import { useSaveAlignment } from '../api/save-alignment.ts';
import { lineDraftOf, newLine, pointsOf } from '../drafts/line-draft.ts';
import {
  beginningLike,
  BLANK_OPTION,
  draftOf,
  rebasedLine,
  rebasedOption,
} from '../drafts/option-draft.ts';
import { optionClash } from '../option-clash.ts';
import { useLineDraft } from './use-line-draft.ts';
import { useWrittenOption } from './use-written-option.ts';

/** The draft of an option and what it is made from: null where a new one is drawn. */
function useOptionDraft() {
  const drafting = useLineDraft();
  const { line } = drafting;
  const [base, setBase] = useState<AlignmentAnswer | null>(null);
  const points = useMemo(() => (line === null ? [] : pointsOf(line)), [line]);
  const { form, design, shafts, begin } = useWrittenOption(points);
  const isEditing = line !== null;
  return {
    ...{ drafting, form, base, setBase, points, isEditing },
    /** Points are being pressed on the map one after the other. */
    isDrawing: line !== null && !line.isSet,
    hasEdits: isEditing && (form.formState.isDirty || drafting.steps.past > 0),
    design: isEditing ? design : null,
    shafts,
    begin: (option: AlignmentAnswer | null, like: AlignmentAnswer | null) => {
      setBase(option);
      if (option !== null) begin(draftOf(option.name, option.design, option.shafts));
      else begin(like === null ? BLANK_OPTION : beginningLike(like.design));
      drafting.set(option === null ? newLine() : lineDraftOf(option.design.line));
    },
    /** Lays what was written and drawn on what somebody else left. */
    rebase: (theirs: AlignmentAnswer) => {
      if (base === null) return;
      const [from, onto] = [
        draftOf(base.name, base.design, base.shafts),
        draftOf(theirs.name, theirs.design, theirs.shafts),
      ];
      const mine = rebasedOption(form.getValues(), from, onto);
      const merged = rebasedLine(points, base.design.line, theirs.design.line);
      form.reset(onto);
      form.reset(mine, { keepDefaultValues: true });
      if (merged !== points) drafting.edit(() => lineDraftOf(merged));
      setBase(theirs);
    },
  };
}

/** The option that is written and drawn until it is saved or given up. */
export function useOptionEditor(
  schemeId: string,
  options: readonly AlignmentAnswer[],
  onSaved: (saved: AlignmentAnswer) => void,
) {
  const { begin, rebase, setBase, ...draft } = useOptionDraft();
  const { drafting, form, base, hasEdits } = draft;
  const [isAsking, setAsking] = useState(false);
  const saving = useSaveAlignment(schemeId);
  const { theirs, isGone } = optionClash(base, options, saving.error);

  function end(): void {
    setAsking(false);
    drafting.set(null);
  }
  function beginWith(option: AlignmentAnswer | null, like: AlignmentAnswer | null): void {
    saving.reset();
    begin(option, like);
  }
  const save = form.handleSubmit((whole) => {
    if (saving.isPending) return;
    saving.mutate(
      { base, ...whole },
      {
        onSuccess: (saved) => {
          end();
          onSaved(saved);
        },
        onError: (error) => {
          showFieldFaults(error, form, ['name']);
        },
      },
    );
  });
  return {
    ...{ ...draft, theirs, isGone, isAsking, save, end, begin: beginWith },
    ...{ busy: saving.isPending, error: saving.error },
    /** Theirs beneath mine: each value that was not touched here becomes theirs. */
    keepMine: () => {
      if (theirs !== null) rebase(theirs);
      saving.reset();
    },
    takeTheirs: () => {
      if (theirs !== null) beginWith(theirs, null);
    },
    /** What was removed meanwhile is saved as an option of its own. */
    saveAsNew: () => {
      setBase(null);
      saving.reset();
    },
    giveUp: () => {
      if (hasEdits) setAsking(true);
      else end();
    },
    keepOn: () => {
      setAsking(false);
    },
  };
}

export type OptionEditor = ReturnType<typeof useOptionEditor>;
