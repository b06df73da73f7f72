import { useMemo } from 'react';
import { centralSurface } from '../../../../shared/assessment/central-surface.ts';
import { MethodError } from '../../../../shared/method-error.ts';
import type { AlignmentDesign, Shafts } from '../../../../shared/schemas/alignments.ts';
import type { SchemeAnswer } from '../../../../shared/schemas/schemes.ts';
import type { WordsAt } from '../../map/components/plan-map-props.ts';
import type { LineShape } from '../../map/map-line.ts';
import { can } from '../../schemes/can.ts';
import { cursorWords } from '../cursor-words.ts';
import { shapesOfShafts } from '../line-shapes.ts';
import { mapDrawingOfLine } from '../map-drawing-of-line.ts';
import { placeOnLine } from '../place-on-line.ts';
import type { Case } from '../preview/preview-work.ts';
import { useChosenOption, type ChosenOption } from './use-chosen-option.ts';
import { useLineKeys } from './use-line-keys.ts';
import { useOptionEditor, type OptionEditor } from './use-option-editor.ts';
import { useCase, usePreview } from './use-preview.ts';
import { useRecordedLine, type RecordedLine } from './use-recorded-line.ts';
import { usePreviewThread } from './use-worked.ts';

function surfaceOf(preview: Case | null) {
  if (preview === null) return null;
  try {
    return centralSurface(preview.design, preview.rules);
  } catch (error) {
    if (error instanceof MethodError) return null;
    throw error;
  }
}

/** What is drawn of the line: what is edited, what a run recorded, or the option as it is. */
function designOf(
  { isEditing, design }: OptionEditor,
  { record, isPending }: RecordedLine,
  { option, isNamed }: ChosenOption,
): AlignmentDesign | null {
  if (isEditing) return design;
  if (record !== null) return record.design;
  return isPending && isNamed ? null : (option?.design ?? null);
}

/** All that is drawn of a line; the same as long as its parts are. */
function useShapes(
  contours: readonly LineShape[],
  drives: readonly LineShape[],
  shafts: Shafts | undefined,
): readonly LineShape[] {
  return useMemo(
    () => [...contours, ...drives, ...shapesOfShafts(shafts ?? [])],
    [contours, drives, shafts],
  );
}

/** The line on the plan: the option that is chosen or edited, what is seen of it, and its tools. */
export function usePlanLine(scheme: SchemeAnswer, isBusyElsewhere: boolean) {
  const mayEdit = can(scheme, 'updateAlignments');
  const chosen = useChosenOption(scheme.id, {
    alignments: can(scheme, 'readAlignments'),
    runs: can(scheme, 'readRuns'),
  });
  const { option, options, choose } = chosen;
  const editor = useOptionEditor(scheme.id, options, ({ id }) => {
    choose(id);
  });
  const recorded = useRecordedLine(scheme.id, chosen, editor.isEditing);
  const { record, isPending } = recorded;
  const design = designOf(editor, recorded, chosen);
  const preview = useCase(scheme.id, design, record?.rules);
  // contours take their time, and what follows the cursor does not wait for them
  const thread = usePreviewThread();
  const estimated = usePreview(design, record === null && !isPending ? preview : null);
  const { drives, fault } = estimated;
  const contours = record === null ? estimated.contours : recorded.contours;
  const shapes = useShapes(contours, drives, editor.isEditing ? editor.shafts : option?.shafts);
  const surface = useMemo(() => surfaceOf(preview), [preview]);
  const mayBegin = mayEdit && chosen.isKnown && !editor.isEditing && !isBusyElsewhere;

  function edit(): void {
    editor.begin(option, null);
  }
  useLineKeys(editor, mayBegin ? edit : null);
  const wordsAt: WordsAt = (place) => {
    const at = design === null ? null : placeOnLine(design.line, place);
    return at === null ? [] : cursorWords(at, place, surface);
  };
  const { line } = editor.drafting;

  return {
    ...{
      ...chosen,
      schemeId: scheme.id,
      mayEdit,
      mayBegin,
      isBusyElsewhere,
      editor,
      recorded,
      design,
      preview,
      thread,
      fault,
      shapes,
      edit,
      wordsAt,
    },
    /** Settlement is seen that no run recorded. */
    isPreview: record === null && contours.length > 0,
    draw: () => {
      editor.begin(null, option);
    },
    map: line === null ? null : mapDrawingOfLine(line, editor.drafting),
  };
}

export type PlanLine = ReturnType<typeof usePlanLine>;
