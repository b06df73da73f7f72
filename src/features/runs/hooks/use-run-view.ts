import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { useSearchParams } from 'react-router-dom';
import type { RunAnswer } from '../../../../shared/schemas/runs.ts';
import type { RunMap } from '../../../../shared/schemas/run-map.ts';
import { runMapQuery } from '../api/get-run-map.ts';
import {
  COLOURINGS,
  ENDS,
  shadesOfRun,
  type Colouring,
  type End,
  type Shading,
} from '../shades-of-run.ts';
import { tipOfRun } from '../tip-of-run.ts';

const NO_SHADES: ReadonlyMap<number, number> = new Map();
const [SHOW, VALUE] = ['show', 'value'];

/** By what the address says that buildings are coloured, and at which value; and the ways to say otherwise. */
function useColouring() {
  const [search, setSearch] = useSearchParams();
  const by: Colouring = COLOURINGS.find((one) => one === search.get(SHOW)) ?? 'category';
  const end: End = ENDS.find((one) => one === search.get(VALUE)) ?? 'central';
  function set(name: string, value: string): void {
    setSearch(
      (now) => {
        const next = new URLSearchParams(now);
        next.set(name, value);
        return next;
      },
      { replace: true },
    );
  }
  return {
    ...{ by, end },
    colourBy: (next: Colouring) => {
      set(SHOW, next);
    },
    showEnd: (next: End) => {
      set(VALUE, next);
    },
  };
}

function shadingOf(figures: RunMap | undefined, by: Colouring, end: End): Shading | null {
  if (figures === undefined || by === 'nothing') return null;
  return { by, shades: shadesOfRun(figures, by, end) };
}

/** What a run found, as the map shows it. */
export function useRunView(schemeId: string, run: RunAnswer | null) {
  const colouring = useColouring();
  const { by, end } = colouring;
  const found = useQuery({ ...runMapQuery(schemeId, run?.id ?? ''), enabled: run !== null });
  const figures = run === null ? undefined : found.data;
  const shading = useMemo(() => shadingOf(figures, by, end), [figures, by, end]);
  const tipOf = useMemo(() => (figures === undefined ? undefined : tipOfRun(figures)), [figures]);
  // where nothing is to be seen, buildings are told so, and the layers stay
  const shades = figures === undefined ? null : (shading?.shades ?? NO_SHADES);
  return {
    ...colouring,
    schemeId,
    run,
    figures,
    shading,
    shades,
    tipOf,
    error: found.error,
    refetch: found.refetch,
  };
}

export type RunView = ReturnType<typeof useRunView>;
