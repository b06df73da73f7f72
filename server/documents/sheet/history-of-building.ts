import { capital } from '../../../shared/presentation/capital.ts';
import type { Sequelize } from 'sequelize';
import { CATEGORIES } from '../../../shared/damage/categories.ts';
import { percentWords } from '../../../shared/presentation/bracket-words.ts';
import { momentWords } from '../../exports/moment-words.ts';
import { findDecisions, type FoundDecision } from '../../models/find-decisions.ts';
import { findVisits, type FoundVisit } from '../../models/find-visits.ts';
import { findMeasures, type FoundMeasure } from '../../models/measures.ts';
import type { HistoryLine } from './sheet-material.ts';

type Dated = HistoryLine & { readonly at: Date };

function sentences(parts: readonly (string | null | false)[]): string {
  return parts.filter((part) => part !== null && part !== false && part !== '').join(' ');
}

function ofDecision(decision: FoundDecision): Dated[] {
  const { preparedAt, preparedBy, kind, category, reason, runNumber, state } = decision;
  const { checkedAt, checkedBy, comment, changes } = decision;
  const label = CATEGORIES.find((row) => row.category === category)?.label;
  const adopted = label === undefined ? null : `Category ${label}.`;
  const on = `On run ${runNumber}, rules version ${decision.rulesVersion}.`;
  const changed = changes !== null && 'What it rests on has changed since.';
  const detail = sentences([adopted, reason, on, `It is ${state}.`, changed]);
  const prepared = {
    ...{ at: preparedAt, date: momentWords(preparedAt) },
    ...{ what: capital(kind), by: preparedBy.name, detail },
  };
  if (checkedAt === null || checkedBy === null) return [prepared];
  const what = state === 'returned' ? 'Returned' : 'Checked';
  const checked = {
    ...{ at: checkedAt, date: momentWords(checkedAt) },
    ...{ what: `${what}: ${kind}`, by: checkedBy.name, detail: comment ?? '' },
  };
  return [prepared, checked];
}

function ofVisit(visit: FoundVisit): Dated {
  const { visitedAt, by, part, condition, construction, notes, defects, photographs } = visit;
  const found = defects.map(({ place, kind, width }) =>
    [kind, place, width === null ? '' : `${width} mm`].filter((word) => word !== '').join(', '),
  );
  const detail = sentences([
    condition !== null && `Condition ${condition}.`,
    construction !== null && `Construction ${construction}.`,
    found.length > 0 && `Found: ${found.join('; ')}.`,
    notes,
    photographs.length > 0 && `Photographs: ${photographs.length}.`,
  ]);
  return {
    ...{ at: visitedAt, date: momentWords(visitedAt) },
    ...{ what: `Visit, ${part}`, by, detail },
  };
}

function ofMeasure(measure: FoundMeasure): Dated {
  const { changedAt, createdBy, kind, title, detail, state, responsible, due, limit } = measure;
  const promised =
    limit !== null &&
    `Volume loss at most ${percentWords(limit.volumeLoss, 2)} from chainage ${limit.from} to ${limit.to} m.`;
  return {
    ...{ at: changedAt, date: momentWords(changedAt) },
    ...{ what: `Measure ${kind}: ${title}`, by: createdBy },
    detail: sentences([
      `${capital(state)}.`,
      promised,
      responsible !== '' && `Responsible: ${responsible}.`,
      due !== null && `Due ${due}.`,
      detail,
    ]),
  };
}

/** What people have decided, seen and agreed about a building, for an option, in order of time. */
export async function historyOfBuilding(
  database: Sequelize,
  { schemeId, optionId }: { readonly schemeId: string; readonly optionId: string },
  buildingId: number,
): Promise<readonly HistoryLine[]> {
  const [decisions, visits, measures] = await Promise.all([
    findDecisions(database, optionId, buildingId),
    findVisits(database, buildingId),
    findMeasures(database, schemeId, { building: buildingId }),
  ]);
  const lines = [
    ...decisions.filter(({ state }) => state !== 'withdrawn').flatMap(ofDecision),
    ...visits.map(ofVisit),
    ...measures.map(ofMeasure),
  ];
  return lines
    .sort((a, b) => a.at.getTime() - b.at.getTime())
    .map(({ date, what, by, detail }) => ({ date, what, by, detail }));
}
