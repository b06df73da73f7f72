import { z } from 'zod';
import type { KeptVisit } from './kept-visit.ts';
import type { VisitStore } from './visit-store.ts';

const VISITS = 'visits';
const PHOTOGRAPHS = 'photographs';

/** Nobody else writes here. */
const visits = z.array(z.custom<KeptVisit>());
const photograph = z.custom<Blob>().optional();

function answered<T>(request: IDBRequest<T>): Promise<T> {
  return new Promise((resolve, reject) => {
    request.onsuccess = () => {
      resolve(request.result);
    };
    request.onerror = () => {
      reject(new Error('This phone cannot keep visits.', { cause: request.error }));
    };
  });
}

function done(transaction: IDBTransaction): Promise<void> {
  return new Promise((resolve, reject) => {
    const fail = () => {
      reject(new Error('This phone cannot keep the visit.', { cause: transaction.error }));
    };
    transaction.oncomplete = () => {
      resolve();
    };
    transaction.onerror = fail;
    transaction.onabort = fail;
  });
}

function opened(name: string): Promise<IDBDatabase> {
  const request = indexedDB.open(name, 1);
  request.onupgradeneeded = () => {
    request.result.createObjectStore(VISITS, { keyPath: 'id' });
    request.result.createObjectStore(PHOTOGRAPHS);
  };
  return answered(request);
}

/** Visits in the browser's own database, which outlives reloading and days without a network. */
export function indexedVisitStore(name: string): VisitStore {
  let database: Promise<IDBDatabase> | undefined;
  function open(): Promise<IDBDatabase> {
    database ??= opened(name).catch((error: unknown) => {
      // so that the next call tries anew
      database = undefined;
      throw error;
    });
    return database;
  }
  async function write(change: (transaction: IDBTransaction) => void): Promise<void> {
    const transaction = (await open()).transaction([VISITS, PHOTOGRAPHS], 'readwrite');
    change(transaction);
    await done(transaction);
  }
  async function read(store: string, ask: (store: IDBObjectStore) => IDBRequest): Promise<unknown> {
    return answered<unknown>(ask((await open()).transaction(store).objectStore(store)));
  }
  return {
    all: async () => visits.parse(await read(VISITS, (store) => store.getAll())),
    put: (visit) => write((transaction) => transaction.objectStore(VISITS).put(visit)),
    remove: (visit) =>
      write((transaction) => {
        transaction.objectStore(VISITS).delete(visit.id);
        for (const { id } of visit.photographs) transaction.objectStore(PHOTOGRAPHS).delete(id);
      }),
    photograph: async (id) => photograph.parse(await read(PHOTOGRAPHS, (store) => store.get(id))),
    putPhotograph: (id, file) =>
      write((transaction) => transaction.objectStore(PHOTOGRAPHS).put(file, id)),
    removePhotograph: (id) =>
      write((transaction) => {
        transaction.objectStore(PHOTOGRAPHS).delete(id);
      }),
  };
}
