import { useEffect, useRef, useState } from 'react';
import { MATTER_LIMITS } from '../../../../shared/schemas/matters.ts';
import { shrunkPhotograph } from '../../visits/photographs/shrunk-photograph.ts';

/** A photograph that goes with a message. */
export type AddedPhotograph = {
  readonly id: string;
  readonly file: Blob;
  /** Where the page shows it from. */
  readonly url: string;
  readonly caption: string;
};

const UNREADABLE = 'That file cannot be read as a photograph. Please choose another one.';

/** Photographs that were added to a form, small enough to be sent from a street. */
export function usePhotographs() {
  const [added, setAdded] = useState<readonly AddedPhotograph[]>([]);
  const [fault, setFault] = useState<string | null>(null);
  const urls = useRef<string[]>([]);
  useEffect(() => {
    const made = urls.current;
    return () => {
      for (const url of made) URL.revokeObjectURL(url);
    };
  }, []);

  async function add(taken: File): Promise<void> {
    setFault(null);
    const small = await shrunkPhotograph(taken);
    if (small === null) {
      setFault(UNREADABLE);
      return;
    }
    const url = URL.createObjectURL(small.file);
    urls.current.push(url);
    const one = { id: crypto.randomUUID(), file: small.file, url, caption: '' };
    setAdded((others) => [...others, one]);
  }
  return {
    added,
    /** What is told of them before they are sent. */
    announced: added.map(({ id, caption }) => ({ id, caption })),
    fault,
    hasRoom: added.length < MATTER_LIMITS.photographs,
    add: (taken: File) => void add(taken),
    caption: (id: string, caption: string) => {
      setAdded((all) => all.map((one) => (one.id === id ? { ...one, caption } : one)));
    },
    remove: (id: string) => {
      setAdded((all) => all.filter((one) => one.id !== id));
    },
    clear: () => {
      setAdded([]);
    },
  };
}

export type Photographs = ReturnType<typeof usePhotographs>;
