import { useMemo } from 'react';
import { MethodError } from '../../../../shared/method-error.ts';
import type { SchemeAnswer } from '../../../../shared/schemas/schemes.ts';
import type { WordsAt } from '../../map/components/plan-map-props.ts';
import type { LineShape } from '../../map/map-line.ts';
import { can } from '../../schemes/can.ts';
import { cursorWords } from '../cursor-words.ts';
import { mapDrawingOfLine } from '../map-drawing-of-line.ts';
import { placeOnLine } from '../place-on-line.ts';
import { centralSurface, type Case } from '../preview/preview-work.ts';
import { useChosenOption } from './use-chosen-option.ts';
import { useLineKeys } from './use-line-keys.ts';
import { useOptionEditor } from './use-option-editor.ts';
import { useCase, usePreview } from './use-preview.ts';

function surfaceOf(preview: Case | null) {
  if (preview === null) return null;
  try {
    return centralSurface(preview);
  } catch (error) {
    if (error instanceof MethodError) return null;
    throw error;
  }
}

/** The line on the plan: the option that is chosen or edited, what is seen of it, and its tools. */
export function usePlanLine(scheme: SchemeAnswer, isBusyElsewhere: boolean) {
  const mayEdit = can(scheme, 'updateAlignments');
  const chosen = useChosenOption(scheme.id, can(scheme, 'readAlignments'));
  const { option, options, choose } = chosen;
  const editor = useOptionEditor(scheme.id, options, ({ id }) => {
    choose(id);
  });
  const design = editor.isEditing ? editor.design : (option?.design ?? null);
  const preview = useCase(scheme.id, design);
  const { drives, contours, fault } = usePreview(design, preview);
  const shapes = useMemo<readonly LineShape[]>(() => [...contours, ...drives], [contours, drives]);
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
      mayEdit,
      mayBegin,
      isBusyElsewhere,
      editor,
      design,
      preview,
      fault,
      shapes,
      edit,
      wordsAt,
    },
    hasContours: contours.length > 0,
    draw: () => {
      editor.begin(null, option);
    },
    map: line === null ? null : mapDrawingOfLine(line, editor.drafting),
  };
}

export type PlanLine = ReturnType<typeof usePlanLine>;
