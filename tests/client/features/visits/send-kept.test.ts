import { describe, expect, test } from 'vitest';
import type { KeptVisit } from '../../../../src/features/visits/draft/kept-visit.ts';
import { sendKept, type VisitPost } from '../../../../src/features/visits/draft/send-kept.ts';
import { ApiError, unreachableError } from '../../../../src/lib/api-error.ts';
import { anId } from '../../../support/answers.ts';
import { aKeptPhotograph, aKeptVisit, visitStoreInMemory } from '../../../support/kept-visits.ts';

/** A server that records what it is sent; `refuse` throws where it should not. */
function aServer(refuse: (what: string) => void = () => undefined) {
  const got: string[] = [];
  function take(what: string): Promise<void> {
    refuse(what);
    got.push(what);
    return Promise.resolve();
  }
  const post: VisitPost = {
    visit: ({ id }) => take(id),
    photograph: (_, id) => take(id),
  };
  return { post, got };
}

function withPhotographs(overrides: Partial<KeptVisit> = {}): KeptVisit {
  return aKeptVisit({ photographs: [aKeptPhotograph(), aKeptPhotograph()], ...overrides });
}

/** Everything of a visit, in the order in which it goes. */
function partsOf({ id, photographs }: KeptVisit): string[] {
  return [id, ...photographs.map((photograph) => photograph.id)];
}

describe('what is kept on this phone', () => {
  test('goes one after the other, the oldest visit first, and leaves the phone', async () => {
    const late = withPhotographs({ visitedAt: '2026-12-02T09:00:00+01:00' });
    const early = withPhotographs({ visitedAt: '2026-12-02T08:30:00Z' });
    const first = withPhotographs({ visitedAt: '2026-12-01T08:30:00Z' });
    const phone = visitStoreInMemory(early, late, first);
    const server = aServer();
    expect(await sendKept(phone.store, server.post, anId())).toEqual({ sent: 3, stopped: null });
    expect(server.got).toEqual([first, late, early].flatMap(partsOf));
    expect([phone.visits.size, phone.files.size]).toEqual([0, 0]);
  });

  test('is the person’s own, and recorded: nothing else goes', async () => {
    const draft = withPhotographs({ state: 'draft' });
    const clash = withPhotographs({ state: 'clash' });
    const other = withPhotographs({ personId: anId(2) });
    const phone = visitStoreInMemory(draft, clash, other);
    const server = aServer();
    expect(await sendKept(phone.store, server.post, anId())).toEqual({ sent: 0, stopped: null });
    expect(server.got).toEqual([]);
    expect([...phone.visits.values()]).toEqual([draft, clash, other]);
  });

  test.each([0, 1, 2])(
    'is whole after a break at part %i: nothing doubled, nothing lost',
    async (at) => {
      const visit = withPhotographs();
      const phone = visitStoreInMemory(visit);
      const broken = partsOf(visit)[at];
      const bad = aServer((what) => {
        if (what === broken) throw unreachableError();
      });
      const outcome = await sendKept(phone.store, bad.post, anId());
      expect(outcome).toMatchObject({ sent: 0, stopped: { code: 'unreachable' } });
      expect(phone.files.size).toBe(2);
      const good = aServer();
      expect(await sendKept(phone.store, good.post, anId())).toEqual({ sent: 1, stopped: null });
      expect([...bad.got, ...good.got]).toEqual(partsOf(visit));
      expect([phone.visits.size, phone.files.size]).toEqual([0, 0]);
    },
  );

  test('stops at the first that cannot be sent, so that the order stays', async () => {
    const [a, b] = [withPhotographs({ visitedAt: '2026-12-01T08:00:00Z' }), withPhotographs()];
    const phone = visitStoreInMemory(a, b);
    const server = aServer(() => {
      throw new ApiError('not-signed-in', 'Please sign in.', 401);
    });
    const outcome = await sendKept(phone.store, server.post, anId());
    expect(outcome.stopped?.message).toBe('Please sign in.');
    expect([...phone.visits.values()]).toEqual([a, b]);
  });

  test('of which the register has changed waits for a choice, and the next one goes', async () => {
    const [a, b] = [withPhotographs({ visitedAt: '2026-12-01T08:00:00Z' }), withPhotographs()];
    const phone = visitStoreInMemory(a, b);
    const server = aServer((what) => {
      if (what === a.id) throw new ApiError('conflict', 'Somebody else changed B0001.', 409);
    });
    expect(await sendKept(phone.store, server.post, anId())).toEqual({ sent: 1, stopped: null });
    expect(server.got).toEqual(partsOf(b));
    const changed = { state: 'clash', fault: 'Somebody else changed B0001.' };
    expect([...phone.visits.values()]).toEqual([{ ...a, ...changed }]);
    expect(phone.files.size).toBe(2);
  });

  test('that the server will not have says why and stays', async () => {
    const visit = withPhotographs();
    const phone = visitStoreInMemory(visit);
    const second = visit.photographs[1]?.id ?? '';
    const server = aServer((what) => {
      if (what === second) throw new ApiError('unreadable', 'The photograph is damaged.', 422);
    });
    expect(await sendKept(phone.store, server.post, anId())).toEqual({ sent: 0, stopped: null });
    expect(phone.visits.get(visit.id)).toMatchObject({
      ...{ state: 'refused', isRecorded: true },
      fault: 'Photograph 2 was not taken: The photograph is damaged.',
      photographs: [{ isSent: true }, { isSent: false }],
    });
  });

  test('whose photograph is gone from the phone says so', async () => {
    const visit = withPhotographs();
    const phone = visitStoreInMemory(visit);
    phone.files.delete(visit.photographs[0]?.id ?? '');
    await sendKept(phone.store, aServer().post, anId());
    expect(phone.visits.get(visit.id)?.fault).toMatch(/^Photograph 1 was not taken/);
  });
});
