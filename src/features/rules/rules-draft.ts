import type { RuleSet } from '../../../shared/schemas/rules.ts';
import { fromMetres, fromSlope, toMetres, toNumber, toSlope } from './display-units.ts';

type Ruled<T> = { value: T; source: string; date: string };

export type LayerDraft = {
  baseLevel: string;
  troughWidth: { low: string; central: string; high: string };
};

export type HoldDraft = {
  name: string;
  condition: { kind: string; depth: string; total: string };
  stages: string[];
  source: string;
  date: string;
};

export type ReasonDraft = { score: string; reason: string };

export type ReasonsDraft = { structure: ReasonDraft[]; features: ReasonDraft[] };

/** Rules while they are being written: the same shape, with figures as typed and in people's units. */
export type RulesDraft = {
  screening: Ruled<{ settlement: string; slope: string }>;
  holds: HoldDraft[];
  depth: Ruled<{ kind: string; layers: LayerDraft[] }>;
  focus: Ruled<string>;
  cutOff: Ruled<{ kind: string; settlement: string; widths: string }>;
  horizontalStrain: Ruled<string>;
  compression: Ruled<string>;
  leadingCategory: Ruled<string>;
  sensitivity: Ruled<ReasonsDraft>;
};

type Depth = RuleSet['depth']['value'];
type Reasons = RuleSet['sensitivity']['value'];

/** A layer that nothing is known of yet. */
export function blankLayer(): LayerDraft {
  return { baseLevel: '', troughWidth: { low: '', central: '', high: '' } };
}

function layersOf(depth: Depth): LayerDraft[] {
  if (depth.kind !== 'layered') return [blankLayer()];
  return depth.layers.map(({ baseLevel, troughWidth: { low, central, high } }) => ({
    baseLevel: String(baseLevel),
    troughWidth: { low: String(low), central: String(central), high: String(high) },
  }));
}

function holdDraft({ condition, stages, ...hold }: RuleSet['holds'][number]): HoldDraft {
  return {
    ...hold,
    stages: stages.map(String),
    condition: {
      kind: condition.kind,
      depth: 'depth' in condition ? String(condition.depth) : '',
      total: 'total' in condition ? String(condition.total) : '',
    },
  };
}

function reasonDraft({ score, reason }: Reasons['structure'][number]): ReasonDraft {
  return { score: String(score), reason };
}

function reasonsDraft({ structure, features }: Reasons): ReasonsDraft {
  return { structure: structure.map(reasonDraft), features: features.map(reasonDraft) };
}

/** The rules of a scheme, ready to be written in. */
export function draftOf(rules: RuleSet): RulesDraft {
  const { screening, depth, cutOff, leadingCategory, sensitivity } = rules;
  const { settlement, slope } = screening.value;
  const cut = cutOff.value;
  return {
    ...rules,
    screening: {
      ...screening,
      value: { settlement: fromMetres(settlement), slope: fromSlope(slope) },
    },
    holds: rules.holds.map(holdDraft),
    depth: { ...depth, value: { kind: depth.value.kind, layers: layersOf(depth.value) } },
    cutOff: {
      ...cutOff,
      value: {
        kind: cut.kind,
        settlement: cut.kind === 'settlement' ? fromMetres(cut.settlement) : '1',
        widths: cut.kind === 'widths' ? String(cut.widths) : '2.5',
      },
    },
    leadingCategory: { ...leadingCategory, value: String(leadingCategory.value) },
    sensitivity: { ...sensitivity, value: reasonsDraft(sensitivity.value) },
  };
}

function depthOf({ kind, layers }: RulesDraft['depth']['value']): unknown {
  if (kind !== 'layered') return { kind };
  return {
    kind,
    layers: layers.map(({ baseLevel, troughWidth: { low, central, high } }) => ({
      baseLevel: toNumber(baseLevel),
      troughWidth: { low: toNumber(low), central: toNumber(central), high: toNumber(high) },
    })),
  };
}

function cutOffOf({ kind, settlement, widths }: RulesDraft['cutOff']['value']): unknown {
  if (kind === 'widths') return { kind, widths: toNumber(widths) };
  return { kind, settlement: toMetres(settlement) };
}

function conditionOf({ kind, depth, total }: HoldDraft['condition']): unknown {
  if (kind === 'founded deeper than') return { kind, depth: toNumber(depth) };
  return kind === 'sensitivity total from' ? { kind, total: toNumber(total) } : { kind };
}

function reasonsOf(reasons: readonly ReasonDraft[]): unknown {
  return reasons.map(({ score, reason }) => ({ score: toNumber(score), reason }));
}

/** The draft as the rules it stands for, still to be checked by their schema. */
export function rulesOf(draft: RulesDraft): unknown {
  const { screening, depth, cutOff, leadingCategory, sensitivity, holds } = draft;
  const { settlement, slope } = screening.value;
  return {
    ...draft,
    screening: {
      ...screening,
      value: { settlement: toMetres(settlement), slope: toSlope(slope) },
    },
    holds: holds.map((hold) => ({
      ...hold,
      stages: hold.stages.map(Number),
      condition: conditionOf(hold.condition),
    })),
    depth: { ...depth, value: depthOf(depth.value) },
    cutOff: { ...cutOff, value: cutOffOf(cutOff.value) },
    leadingCategory: { ...leadingCategory, value: toNumber(leadingCategory.value) },
    sensitivity: {
      ...sensitivity,
      value: {
        structure: reasonsOf(sensitivity.value.structure),
        features: reasonsOf(sensitivity.value.features),
      },
    },
  };
}
