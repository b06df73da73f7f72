import { ApiError, isRefusal } from '../../../lib/api-error.ts';
import type { KeptPhotograph, KeptVisit } from './kept-visit.ts';
import type { VisitStore } from './visit-store.ts';

/** How visits and their photographs reach the server. */
export type VisitPost = {
  readonly visit: (visit: KeptVisit) => Promise<void>;
  readonly photograph: (visit: KeptVisit, id: string, file: Blob) => Promise<void>;
};

/** How many went, and why the rest stays; null where nothing is held up. */
export type Sent = { readonly sent: number; readonly stopped: ApiError | null };

/** What another try may mend without anybody's doing; the server said nothing of the visit itself. */
const PASSING: readonly string[] = [
  'unreachable',
  'unexpected-answer',
  'internal',
  'not-signed-in',
  'csrf-failed',
  'too-many-requests',
];

/** The server's own word against a visit or photograph; anything else is thrown on. */
function refusalOf(error: unknown): ApiError {
  if (error instanceof ApiError && !PASSING.includes(error.code)) return error;
  throw error;
}

/** Has the visit recorded, unless it is; gives it as it then stands on this phone. */
async function recorded(store: VisitStore, post: VisitPost, visit: KeptVisit): Promise<KeptVisit> {
  if (visit.isRecorded) return visit;
  let next: KeptVisit = { ...visit, isRecorded: true };
  try {
    await post.visit(visit);
  } catch (error) {
    const { message } = refusalOf(error);
    const state = isRefusal(error, 'conflict') ? 'clash' : 'refused';
    next = { ...visit, state, fault: message };
  }
  await store.put(next);
  return next;
}

/** Sends one photograph; tells why the server would not have it, or null. */
async function sendOne(
  store: VisitStore,
  post: VisitPost,
  visit: KeptVisit,
  { id }: KeptPhotograph,
): Promise<string | null> {
  const file = await store.photograph(id);
  if (file === undefined) return 'Its file is not on this phone any more.';
  try {
    await post.photograph(visit, id, file);
    return null;
  } catch (error) {
    return refusalOf(error).message;
  }
}

/** Sends the photographs that have not gone, one after the other; what has gone is noted at once. */
async function withPhotographs(
  store: VisitStore,
  post: VisitPost,
  visit: KeptVisit,
): Promise<KeptVisit> {
  let next = visit;
  const faults: string[] = [];
  for (const [index, photograph] of visit.photographs.entries()) {
    if (photograph.isSent) continue;
    const fault = await sendOne(store, post, visit, photograph);
    if (fault !== null) {
      faults.push(`Photograph ${index + 1} was not taken: ${fault}`);
      continue;
    }
    const photographs = next.photographs.map((one) =>
      one.id === photograph.id ? { ...one, isSent: true } : one,
    );
    next = { ...next, photographs };
    await store.put(next);
  }
  if (faults.length === 0) return next;
  const refused: KeptVisit = { ...next, state: 'refused', fault: faults.join(' ') };
  await store.put(refused);
  return refused;
}

/**
 * Sends what a person keeps on this phone, the oldest visit first. Whatever was sent and not answered is
 * sent again: the server records it once. A visit leaves the phone when it and all its photographs are there.
 */
export async function sendKept(
  store: VisitStore,
  post: VisitPost,
  personId: string,
): Promise<Sent> {
  const all = await store.all();
  const kept = all
    .filter((visit) => visit.state === 'kept' && visit.personId === personId)
    .sort((a, b) => Date.parse(a.visitedAt ?? '') - Date.parse(b.visitedAt ?? ''));
  let sent = 0;
  for (const visit of kept) {
    try {
      const there = await recorded(store, post, visit);
      if (!there.isRecorded) continue;
      const whole = await withPhotographs(store, post, there);
      if (whole.state !== 'kept') continue;
      await store.remove(whole);
      sent += 1;
    } catch (error) {
      if (error instanceof ApiError) return { sent, stopped: error };
      throw error;
    }
  }
  return { sent, stopped: null };
}
