import type { RefObject } from 'react';
import { momentHere, type KeptPhotograph, type KeptVisit } from '../draft/kept-visit.ts';
import { useVisitStore } from '../draft/visit-store-context.ts';
import { shrunkPhotograph } from '../photographs/shrunk-photograph.ts';

const UNREADABLE = 'This phone cannot read that file as a photograph. Choose another one.';

type Draft = {
  /** As it is by now: letters may have been typed since a photograph was taken. */
  readonly newest: RefObject<KeptVisit>;
  readonly keep: (visit: KeptVisit) => Promise<boolean>;
  readonly setFault: (fault: string | null) => void;
  /** What is said where a photograph cannot be kept. */
  readonly notKept: string;
};

/** How photographs come to a visit that is being written, change and go. */
export function useDraftPhotographs({ newest, keep, setFault, notKept }: Draft) {
  const store = useVisitStore();
  function keepPhotographs(photographs: readonly KeptPhotograph[]): Promise<boolean> {
    return keep({ ...newest.current, photographs });
  }
  async function add(taken: File): Promise<void> {
    setFault(null);
    const small = await shrunkPhotograph(taken);
    if (small === null) {
      setFault(UNREADABLE);
      return;
    }
    const id = crypto.randomUUID();
    try {
      await store.putPhotograph(id, small.file);
    } catch {
      setFault(notKept);
      return;
    }
    const { width, height } = small;
    const takenAt = momentHere(new Date(taken.lastModified));
    const told = { id, caption: '', takenAt, width, height, keepsPlace: false, place: null };
    await keepPhotographs([...newest.current.photographs, { ...told, isSent: false }]);
  }
  async function remove(id: string): Promise<void> {
    await keepPhotographs(newest.current.photographs.filter((one) => one.id !== id));
    await store.removePhotograph(id);
  }
  function change(id: string, part: Partial<KeptPhotograph>): void {
    void keepPhotographs(
      newest.current.photographs.map((one) => (one.id === id ? { ...one, ...part } : one)),
    );
  }
  return { add, remove, change };
}
