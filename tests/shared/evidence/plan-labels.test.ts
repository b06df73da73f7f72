import { describe, expect, it } from 'vitest';
import { groundFrame } from '../../../shared/evidence/ground-frame.ts';
import { labelBoxOf, labelsMeet, type LabelBox } from '../../../shared/evidence/label-box.ts';
import { labelList } from '../../../shared/evidence/label-list.ts';
import { planLabels, type PlanLabel } from '../../../shared/evidence/plan-labels.ts';
import type { PlanBuilding } from '../../../shared/evidence/plan-material.ts';
import { planDistance } from '../../../shared/geometry/plan-distance.ts';
import { aDesign } from '../../support/designs.ts';
import { aPlan } from '../../support/evidence.ts';
import {
  aPlanBuilding,
  aPlanMaterial,
  aRowOfHouses,
  evenMeasure,
} from '../../support/plan-material.ts';

const WINDOW = { left: 17, top: 17, right: 307, bottom: 276 };
const FRAME = groundFrame(WINDOW, { centre: [0, 0], denominator: 1250 });
const { content } = aPlan([0, 0]);

/** Twelve rows of houses that are 2 mm wide on paper: far more labels than there is room for. */
const NARROW: PlanBuilding[] = Array.from({ length: 12 }, (_, row) =>
  aRowOfHouses(60, { west: -75, south: -75 + 11 * row, wide: 2.5, deep: 9 }).map((one) => ({
    ...one,
    id: `${row}-${one.id}`,
    reference: `${row}/${one.id}`,
  })),
).flat();

function labelsOf(
  buildings: PlanBuilding[],
  more: Partial<typeof content> = {},
  kept: readonly LabelBox[] = [],
) {
  const about = { content: { ...content, ...more }, design: aDesign(), measure: evenMeasure };
  return planLabels(FRAME, aPlanMaterial({ buildings }), { ...about, kept });
}

function keyOf({ kind, words, building }: PlanLabel): string {
  return `${kind} ${building?.id ?? ''} ${words}`;
}

describe('planLabels', () => {
  const labels = labelsOf(NARROW);
  const all = [...labels.placed.map(({ what }) => what), ...labels.listed];

  it('places or lists the figure and the name of every building once', () => {
    const found = all.filter(({ building }) => building !== undefined).map(keyOf);
    const wanted = NARROW.flatMap(({ id, reference, result: { category } }) => [
      `figure ${id} ${category === 4 ? '4–5' : String(category)}`,
      `name ${id} ${reference}`,
    ]);
    expect([...found].sort()).toEqual(wanted.sort());
    expect(labels.listed.length).toBeGreaterThan(100);
    expect(labels.placed.length).toBeGreaterThan(100);
  });

  it('has the round chainages on the sheet', () => {
    const words = all.flatMap((one) => (one.kind === 'chainage' ? [one.words] : []));
    expect(words).toEqual(['0+350', '0+400', '0+450', '0+500', '0+550', '0+600', '0+650']);
  });

  it('keeps clear of what else stands on the plan', () => {
    const kept = labelBoxOf({ left: 100, top: 100, right: 180, bottom: 180 });
    const { placed } = labelsOf(NARROW, {}, [kept]);
    expect(labels.placed.some(({ box }) => labelsMeet(box, kept))).toBe(true);
    expect(placed.some(({ box }) => labelsMeet(box, kept))).toBe(false);
  });

  it('lets none lie over another', () => {
    const boxes = labels.taken;
    const meeting = boxes.filter((one, k) =>
      boxes.slice(k + 1).some((other) => labelsMeet(one, other)),
    );
    expect(meeting).toEqual([]);
    expect(boxes).toHaveLength(labels.placed.length + 2);
  });

  it.each([
    ['none', ['1']],
    ['references', ['1', 'B0007']],
    ['addresses', ['1', '3 Cable Street']],
  ] as const)('with names %s writes %s', (names, words) => {
    const { placed, listed } = labelsOf([aPlanBuilding()], { names, line: false });
    expect(listed).toEqual([]);
    expect(placed.map(({ what }) => what.words)).toEqual(words);
  });

  it('leaves out buildings without a colour, and those whose middle is beyond the sheet', () => {
    const plain = aPlanBuilding({ id: '8', result: { stage: 1, category: null } });
    const far = aPlanBuilding({ id: '9', parts: aRowOfHouses(1, { west: 400, south: 0, wide: 9, deep: 9 })[0]?.parts ?? [] }); // prettier-ignore
    expect(labelsOf([plain, far], { line: false }).taken).toHaveLength(2);
  });
});

describe('labelList', () => {
  const lines = labelList(FRAME, labelsOf(NARROW).listed, (figure) => `category ${figure}`);

  it('numbers its lines from 1, from the west', () => {
    expect(lines.map(({ number }) => number)).toEqual(lines.map((_, k) => k + 1));
    const eastings = lines.map(({ place }) => place[0]);
    expect(eastings).toEqual([...eastings].sort((a, b) => a - b));
  });

  it('has one line of each building, at its middle', () => {
    const ids = lines.flatMap(({ labels }) => labels[0]?.building?.id ?? []);
    expect(new Set(ids).size).toBe(ids.length);
    for (const { labels, place } of lines) {
      const id = labels[0]?.building?.id;
      const building = NARROW.find((one) => one.id === id);
      const [west = NaN, south = NaN] = building?.parts[0]?.[0]?.[0] ?? [];
      if (building !== undefined)
        expect(planDistance(place, [west + 1.25, south + 4.5])).toBeLessThan(0.001);
    }
  });

  it('stands for every label that had no room', () => {
    const { listed } = labelsOf(NARROW);
    const found = lines.flatMap(({ labels }) => labels.map(keyOf));
    expect([...found].sort()).toEqual(listed.map(keyOf).sort());
  });

  it('says the name of a building and what its figure means', () => {
    const at = FRAME.place([0, 0]);
    const building = aPlanBuilding();
    const list = labelList(
      FRAME,
      [
        { kind: 'figure', words: '1', at, building },
        { kind: 'chainage', words: '0+500', at: FRAME.place([-20, 0]) },
        { kind: 'contour', words: '10 mm', at: FRAME.place([20, 0]) },
        { kind: 'name', words: 'B0007', at, building },
        { kind: 'name', words: 'Nine Elms', at: FRAME.place([40, 0]), building: aPlanBuilding({ id: '9' }) },
      ],
      (figure) => `category ${figure}`,
    ); // prettier-ignore
    expect(list.map(({ words }) => words)).toEqual([
      'Chainage 0+500',
      'B0007, category 1',
      'Contour 10 mm',
      'Nine Elms',
    ]);
  });
});
