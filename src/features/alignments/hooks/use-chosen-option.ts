import { useQuery } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import type { AlignmentAnswer } from '../../../../shared/schemas/alignments.ts';
import type { RunAnswer } from '../../../../shared/schemas/runs.ts';
import { runsQuery } from '../../runs/api/list-runs.ts';
import { NO_OPTION, shownOnPlan } from '../../runs/shown-on-plan.ts';
import { alignmentsQuery } from '../api/list-alignments.ts';

const [OPTION, RUN] = ['option', 'run'];

type MayRead = { readonly alignments: boolean; readonly runs: boolean };

/** The option and the run that the address names, or what goes with them; and the way to name others. */
export function useChosenOption(schemeId: string, mayRead: MayRead) {
  const [search, setSearch] = useSearchParams();
  const { data } = useQuery({ ...alignmentsQuery(schemeId), enabled: mayRead.alignments });
  const listed = useQuery({ ...runsQuery(schemeId), enabled: mayRead.runs });
  const options: readonly AlignmentAnswer[] = data ?? [];
  const runs: readonly RunAnswer[] = listed.data ?? [];
  // the line stands without its runs, where they do not come
  const isKnown = data !== undefined && !(mayRead.runs && listed.isPending);
  const named = { option: search.get(OPTION), run: search.get(RUN) };
  const shown = shownOnPlan(named, isKnown ? options : [], isKnown ? runs : []);

  function name(what: string, id: string, instead: string): void {
    setSearch(
      (now) => {
        const next = new URLSearchParams(now);
        next.delete(instead);
        next.set(what, id);
        return next;
      },
      { replace: true },
    );
  }
  return {
    ...{ options, runs, isKnown, ...shown },
    choose: (alignmentId: string | null) => {
      name(OPTION, alignmentId ?? NO_OPTION, RUN);
    },
    chooseRun: (runId: string) => {
      name(RUN, runId, OPTION);
    },
  };
}

export type ChosenOption = ReturnType<typeof useChosenOption>;
