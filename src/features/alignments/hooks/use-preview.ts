import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import type { AlignmentDesign } from '../../../../shared/schemas/alignments.ts';
import { useDelayedValue } from '../../../hooks/use-delayed-value.ts';
import { rulesQuery } from '../../rules/api/list-rules.ts';
import type { LineShape } from '../../map/map-line.ts';
import { shapesOfContours, shapesOfDesign } from '../line-shapes.ts';
import type { Case } from '../preview/preview-work.ts';
import { useWorked } from './use-worked.ts';

/** How long a line has to rest before its settlement is worked out again. */
const REST = 150;
const NOTHING: readonly LineShape[] = [];

/** The case of a design under the newest rules of the scheme; null while there is none. */
export function useCase(schemeId: string, design: AlignmentDesign | null): Case | null {
  const { data } = useQuery({ ...rulesQuery(schemeId), enabled: design !== null });
  const rules = data?.[0]?.rules;
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
  const settled = useDelayedValue(preview, REST);
  const worked = useWorked(settled);
  const drives = useMemo(() => (design === null ? NOTHING : shapesOfDesign(design)), [design]);
  const contours = useMemo(
    () => (worked?.kind === 'contours' ? shapesOfContours(worked.contours) : NOTHING),
    [worked],
  );
  return {
    drives,
    contours: design === null ? NOTHING : contours,
    fault: worked?.kind === 'fault' ? worked.message : null,
  };
}
