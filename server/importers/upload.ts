import type { FootprintRings } from '../models/building-footprint.ts';
import type { Properties, Source } from './source.ts';

export type UploadRow = {
  /** From 1, as people count in that format. */
  readonly row: number;
  /** In the file's own coordinates, rings closed, heights dropped. */
  readonly geometry: FootprintRings | null;
  /** Why the row cannot be used, as a sentence. */
  readonly fault: string | null;
  /** Without a prototype. */
  readonly properties: Properties;
};

/** A file that was looked through once and can be taken, as far as its format goes. */
export type Upload = Pick<Source, 'format' | 'kind' | 'layer' | 'crs' | 'notes' | 'columns'> & {
  /** All layers that could be read; none where there is no choice. */
  readonly layers: readonly string[];
  readonly count: number;
  /** In the order of the file, again at every call, in bounded memory. */
  readonly rows: () => AsyncIterable<UploadRow>;
};
