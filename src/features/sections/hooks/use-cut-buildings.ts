import { useQueries, type UseQueryResult } from '@tanstack/react-query';
import { useMemo } from 'react';
import type { SectionAcross } from '../../../../shared/assessment/sections-of-design.ts';
import type { BuildingOutline } from '../../../../shared/schemas/building-outlines.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { outlinesQuery } from '../api/list-outlines.ts';
import { cutBuildings, lineOfSection, type CutBuilding } from '../cut-buildings.ts';
import { squaresUnder } from '../squares-under.ts';

const NONE: readonly CutBuilding[] = [];

function together(results: UseQueryResult<BuildingOutline[]>[]) {
  return {
    outlines: results.flatMap(({ data }) => data ?? []),
    hasFailed: results.some(({ isError }) => isError),
  };
}

/** The buildings that stand on a section, as far as they are known by now. */
export function useCutBuildings(section: SectionAcross | null, halfWidth: number) {
  const { id, registerVersion } = useScheme();
  const squares = section === null ? [] : squaresUnder(lineOfSection(section, halfWidth));
  const { outlines, hasFailed } = useQueries({
    queries: squares.map((square) => outlinesQuery(id, registerVersion, square)),
    combine: together,
  });
  const buildings = useMemo(
    () => (section === null ? NONE : cutBuildings(section, halfWidth, outlines)),
    [section, halfWidth, outlines],
  );
  return { buildings, hasFailed };
}
