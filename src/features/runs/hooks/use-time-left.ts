import { useState } from 'react';
import { timeLeftWords } from '../../../../shared/presentation/run-words.ts';

type Seen = { readonly done: number; readonly at: number };

/** So long it takes until a pace can be told, in ms. */
const WATCH = 3000;

/** How long the rest takes at the pace since it was first seen; undefined until that can be told. */
export function useTimeLeft(done: number, total: number, at: number): string | undefined {
  const [first, setFirst] = useState<Seen>({ done, at });
  // what went back has begun again
  if (done < first.done) setFirst({ done, at });
  const [worked, time] = [done - first.done, at - first.at];
  if (worked <= 0 || time < WATCH || done >= total) return undefined;
  return timeLeftWords((((total - done) / worked) * time) / 1000);
}
