import { useState } from 'react';
import type { MapHandle } from '../../map/map-handle.ts';
import { placeNow } from '../photographs/place-now.ts';

/** Degrees of latitude that a street is seen within. */
const AROUND = 0.001;

type Outcome = 'none' | 'asking' | 'shown' | 'unknown';

const WORDS: Readonly<Record<Outcome, string>> = {
  none: '',
  asking: 'Asking this phone where it is.',
  shown: 'This phone is at the middle of the map.',
  unknown: 'This phone does not say where it is.',
};

/** Brings the place where this phone is to the middle of the map. It is sent nowhere and not kept. */
export function usePlaceOnMap(handle: MapHandle | null) {
  const [outcome, setOutcome] = useState<Outcome>('none');
  async function show(): Promise<void> {
    setOutcome('asking');
    const place = await placeNow();
    setOutcome(place === null ? 'unknown' : 'shown');
    if (place === null) return;
    const [east, north] = place;
    handle?.fit([east - AROUND, north - AROUND, east + AROUND, north + AROUND]);
  }
  return { words: WORDS[outcome], isAsking: outcome === 'asking', show };
}
