import { describe, expect, test } from 'vitest';
import { planChunks, type PlacedBuilding } from '../../../server/runs/plan-chunks.ts';
import { touchingGroups } from '../../../server/runs/touching-groups.ts';

function placed(id: number, west: number, south: number, side = 10): PlacedBuilding {
  return { id, west, south, east: west + side, north: south + side };
}

/** Houses in a row, each touching the next. */
function aRow(from: number, count: number, south: number): PlacedBuilding[] {
  return Array.from({ length: count }, (_, k) => placed(from + k, 10 * k, south));
}

const NOWHERE = { line: [[0, -5000], [10, -5000]] as const, reach: 100 }; // prettier-ignore
const EVERYWHERE = { line: [[0, 0], [100, 0]] as const, reach: 100_000 }; // prettier-ignore

describe('groups of boxes', () => {
  test('hold those that touch, also by way of others, in the order of the boxes', () => {
    const boxes = [placed(0, 0, 0), placed(1, 50, 0), placed(2, 20.5, 0), placed(3, 10.2, 0)];
    expect(touchingGroups(boxes, 1)).toEqual([[0, 2, 3], [1]]);
    expect(touchingGroups([], 1)).toEqual([]);
  });
});

describe('the parts of a run', () => {
  const rows = [0, 1, 2, 3].flatMap((r) => aRow(100 * r, 40, 100 * r));

  test('have every building once, and keep together who may share a wall', () => {
    const chunks = planChunks(rows, NOWHERE);
    const members = chunks.flatMap((chunk) => chunk.members);
    expect([...members].sort((a, b) => a - b)).toEqual(rows.map(({ id }) => id));
    for (const chunk of chunks) {
      expect(chunk.beside).toEqual([]);
      for (const r of [0, 1, 2, 3]) {
        const ofRow = chunk.members.filter((id) => Math.floor(id / 100) === r);
        expect([0, 40]).toContain(ofRow.length);
      }
    }
  });

  test('cut a group that is too large for one, and each then knows the others of it', () => {
    const terrace = aRow(0, 2000, 0);
    const chunks = planChunks(terrace, EVERYWHERE);
    expect(chunks.length).toBeGreaterThan(3);
    for (const { members, beside } of chunks) {
      expect(new Set([...members, ...beside]).size).toBe(2000);
      expect(members.length + beside.length).toBe(2000);
    }
    expect(chunks.flatMap(({ members }) => members)).toHaveLength(2000);
  });

  test('are the smaller the nearer the line is, and none of no buildings', () => {
    const houses = Array.from({ length: 6000 }, (_, k) =>
      placed(k, 20 * (k % 80), 20 * Math.floor(k / 80)),
    );
    const near = planChunks(houses, EVERYWHERE);
    const far = planChunks(houses, NOWHERE);
    expect(near.length).toBeGreaterThan(far.length);
    expect(planChunks([], NOWHERE)).toEqual([]);
  });
});
