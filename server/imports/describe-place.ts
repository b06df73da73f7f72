import type { ImportAnswer, ImportOptions } from '../../shared/schemas/imports.ts';
import { findEntry } from '../crs/find-crs.ts';
import { shiftAccuracy } from '../crs/shift-accuracy.ts';
import { wereExchanged } from './axes-order.ts';
import type { SaidPlace } from '../models/register-import.ts';
import type { Placement } from './placement.ts';

type PlaceFound = NonNullable<ImportAnswer['place']>;

/** What there is to say of a file whose system nobody knows. */
export function unknownPlace({ said, candidates }: SaidPlace): PlaceFound {
  const choose = candidates.length > 0 ? 'Choose one of those it fits' : 'Say which it is';
  const words = `${said} ${choose}, by number or name.`;
  const nothing = { crs: null, name: null, accuracy: null };
  return { ...nothing, from: 'nobody', candidates: [...candidates], words };
}

/** What was found of the order of its axes, where it is as it was found. */
function axesWords(said: SaidPlace, exchangeAxes: boolean): string | null {
  if (exchangeAxes === wereExchanged(said)) return said.axes;
  return exchangeAxes ? 'Its axes are exchanged.' : null;
}

/** How the place of a file was found, how well it is known, and what was done to it, in words. */
export function describePlace(
  said: SaidPlace,
  { crs, exchangeAxes, shift }: ImportOptions['place'],
  { file, scheme }: Placement,
): PlaceFound {
  const { metres, words } = shiftAccuracy(file, scheme);
  const isSaid = said.crs !== null && said.crs === crs;
  const [east, north] = shift;
  const sentences = [
    isSaid ? said.said : `EPSG:${file.code} (${file.name}) was chosen.`,
    words,
    axesWords(said, exchangeAxes),
    (east !== 0 || north !== 0) && `Shifted by ${east} m east and ${north} m north.`,
  ]; // prettier-ignore
  return {
    crs: file.code,
    name: file.name,
    from: isSaid ? said.from : 'the person',
    candidates: [...said.candidates],
    accuracy: metres,
    words: sentences.filter((sentence) => typeof sentence === 'string').join(' '),
  };
}

/** A system as people call it. */
export async function systemName(code: number): Promise<string> {
  const entry = await findEntry(code);
  return entry === undefined ? `EPSG:${code}` : `${entry.name} (EPSG:${code})`;
}
