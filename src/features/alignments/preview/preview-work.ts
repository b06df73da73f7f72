import { centralSurface } from '../../../../shared/assessment/central-surface.ts';
import {
  sectionsOfDesign,
  type SectionsOfDesign,
} from '../../../../shared/assessment/sections-of-design.ts';
import {
  settlementAlong,
  type SettlementOnLine,
} from '../../../../shared/assessment/settlement-along.ts';
import {
  troughOfSection,
  type TroughOfSection,
} from '../../../../shared/assessment/trough-of-section.ts';
import type { GroundRules } from '../../../../shared/ground/ground-model.ts';
import {
  CONTOUR_LEVELS,
  settlementContours,
  type SettlementContour,
} from '../../../../shared/ground/settlement-contours.ts';
import { MethodError } from '../../../../shared/method-error.ts';
import type { AlignmentDesign } from '../../../../shared/schemas/alignments.ts';

/** A design and the rules that its settlement follows. */
export type Case = { readonly design: AlignmentDesign; readonly rules: GroundRules };

/** What is asked of a case: its contours, settlement along its line, or the trough across it. */
export type Question =
  | { readonly kind: 'contours' }
  | { readonly kind: 'along' }
  | { readonly kind: 'across'; readonly chainage: number; readonly halfWidth: number };

/** A question, with its case unless that is the one of the question before. */
export type Message = { readonly preview: Case | null; readonly question: Question };

/** The answer, or in words why the method refuses. */
export type Worked =
  | { readonly kind: 'contours'; readonly contours: readonly SettlementContour[] }
  | { readonly kind: 'along'; readonly rows: readonly SettlementOnLine[] }
  | { readonly kind: 'across'; readonly trough: TroughOfSection }
  | { readonly kind: 'fault'; readonly message: string };

/** As fine along the line as a wide screen shows it. */
const STEPS_ALONG = 400;

/** A case with what is made of it once. */
type Prepared = { readonly preview: Case; sections: SectionsOfDesign | null };

function answer(prepared: Prepared, question: Question): Worked {
  const { design, rules } = prepared.preview;
  switch (question.kind) {
    case 'contours':
      return {
        kind: 'contours',
        contours: settlementContours(centralSurface(design, rules), CONTOUR_LEVELS),
      };
    case 'along':
      return { kind: 'along', rows: settlementAlong(design, rules, STEPS_ALONG) };
    case 'across': {
      prepared.sections ??= sectionsOfDesign(design, rules);
      const { chainage, halfWidth } = question;
      return { kind: 'across', trough: troughOfSection(prepared.sections, chainage, halfWidth) };
    }
  }
}

/** Works out what is asked of one case after another. */
export function createPreviewWork(): (message: Message) => Worked {
  let prepared: Prepared | null = null;
  return ({ preview, question }) => {
    if (preview !== null) prepared = { preview, sections: null };
    if (prepared === null) throw new Error('No case has been given yet.');
    try {
      return answer(prepared, question);
    } catch (error) {
      if (!(error instanceof MethodError)) throw error;
      return { kind: 'fault', message: error.message };
    }
  };
}
