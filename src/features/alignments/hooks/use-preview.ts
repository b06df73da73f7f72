import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import type { AlignmentDesign } from '../../../../shared/schemas/alignments.ts';
import type { RuleSet } from '../../../../shared/schemas/rules.ts';
import { useDelayedValue } from '../../../hooks/use-delayed-value.ts';
import { rulesQuery } from '../../rules/api/list-rules.ts';
import type { LineShape } from '../../map/map-line.ts';
import { shapesOfContours, shapesOfDesign } from '../line-shapes.ts';
import type { Case, Question } from '../preview/preview-work.ts';
import { usePreviewThread, useWorked } from './use-worked.ts';

/** How long a line has to rest before its settlement is worked out again. */
const REST = 150;
const NOTHING: readonly LineShape[] = [];
const CONTOURS: Question = { kind: 'contours' };

/** The case of a design under the rules of its run, or the newest of the scheme; null while there is none. */
export function useCase(
  schemeId: string,
  design: AlignmentDesign | null,
  recorded: RuleSet | undefined,
): Case | null {
  const isAsked = design !== null && recorded === undefined;
  const { data } = useQuery({ ...rulesQuery(schemeId), enabled: isAsked });
  const rules = recorded ?? data?.[0]?.rules;
  return useMemo(
    () =>
      design === null || rules === undefined
        ? null
        : { design, rules: { depth: rules.depth.value, focus: rules.focus.value } },
    [design, rules],
  );
}

/** What is seen of a line: its drives at once, its settlement as soon as it is worked out. */
export function usePreview(design: AlignmentDesign | null, preview: Case | null) {
  const thread = usePreviewThread();
  const settled = useDelayedValue(preview, REST);
  const worked = useWorked(thread, settled, CONTOURS);
  const drives = useMemo(() => (design === null ? NOTHING : shapesOfDesign(design)), [design]);
  const contours = useMemo(
    () => (worked?.kind === 'contours' ? shapesOfContours(worked.contours) : NOTHING),
    [worked],
  );
  return {
    drives,
    contours: design === null || preview === null ? NOTHING : contours,
    fault: worked?.kind === 'fault' ? worked.message : null,
  };
}
