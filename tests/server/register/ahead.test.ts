import { describe, expect, it } from 'vitest';
import { ahead } from '../../../server/register/ahead.ts';

function counting(most: number, failsAt = Infinity) {
  const told: string[] = [];
  async function* items(): AsyncGenerator<number> {
    try {
      for (let k = 0; k < most; k += 1) {
        await Promise.resolve();
        if (k === failsAt) throw new Error(`no ${k}`);
        told.push(`made ${k}`);
        yield k;
      }
    } finally {
      told.push('ended');
    }
  }
  return { told, items: items() };
}

async function worked(source: ReturnType<typeof counting>, stopAt = Infinity): Promise<void> {
  for await (const item of ahead(source.items)) {
    if (item === stopAt) return;
    // time enough for whatever goes on beside
    await new Promise(setImmediate);
    source.told.push(`worked ${item}`);
  }
}

describe('ahead', () => {
  it('makes the next item while the last is worked with, one and no more', async () => {
    const source = counting(3);
    await worked(source);
    expect(source.told).toEqual([
      ...['made 0', 'made 1', 'worked 0', 'made 2', 'worked 1', 'ended', 'worked 2'],
    ]);
  });

  it('has nothing to give of nothing', async () => {
    const source = counting(0);
    await worked(source);
    expect(source.told).toEqual(['ended']);
  });

  it('tells a fault after what came before it was worked with', async () => {
    const source = counting(3, 1);
    await expect(worked(source)).rejects.toThrow('no 1');
    expect(source.told).toEqual(['made 0', 'ended', 'worked 0']);
  });

  it('ends what it was given where somebody leaves early, and forgets a fault that nobody waits for', async () => {
    const source = counting(5, 2);
    await worked(source, 1);
    expect(source.told).toEqual(['made 0', 'made 1', 'worked 0', 'ended']);
  });
});
