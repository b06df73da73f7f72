import type { PhotographType } from '../../shared/schemas/visits.ts';
import { cleanJpeg } from './clean-jpeg.ts';
import { cleanPng } from './clean-png.ts';
import { cleanWebp } from './clean-webp.ts';
import { notAPhotograph } from './refused-photograph.ts';

const PNG = Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]);
const JPEG = Buffer.from([0xff, 0xd8, 0xff]);

type CleanPhotograph = { readonly type: PhotographType; readonly bytes: Buffer };

function isWebp(bytes: Buffer): boolean {
  const [riff, webp] = [bytes.toString('latin1', 0, 4), bytes.toString('latin1', 8, 12)];
  return riff === 'RIFF' && webp === 'WEBP';
}

/**
 * A photograph as it is kept: its type told by what it holds, and nothing in it but the picture. What tells
 * where it was taken stays with consent only.
 */
export function cleanPhotograph(bytes: Buffer, keepsPlace: boolean): CleanPhotograph {
  if (bytes.subarray(0, JPEG.length).equals(JPEG)) {
    return { type: 'image/jpeg', bytes: cleanJpeg(bytes, keepsPlace) };
  }
  if (bytes.subarray(0, PNG.length).equals(PNG)) {
    return { type: 'image/png', bytes: cleanPng(bytes, keepsPlace) };
  }
  if (isWebp(bytes)) return { type: 'image/webp', bytes: cleanWebp(bytes, keepsPlace) };
  throw notAPhotograph();
}
