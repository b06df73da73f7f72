import { AppError } from '../errors.ts';
import { BACKGROUND_LIMITS } from '../../shared/schemas/background.ts';

const HEADING = 100;
const RECORD_HEADING = 8;
/** Where a line's or polygon's count of parts stands after the record's heading, and its parts begin. */
const PARTS_AT = 36;
const FIRST_PART = 44;
/** Rings are sorted into outer ones and holes pair by pair. */
const MOST_PARTS = 5000;
const NULL_SHAPE = 0;
/** Lines and polygons, plain, with heights and with measures. */
const WITH_PARTS = [3, 5, 13, 15, 23, 25];

function damaged(record: number): AppError {
  return new AppError('unreadable', `The shapes cannot be read: record ${record} is damaged.`);
}

/** Parts have to follow one another and to lie in the record, or reading them would never end. */
function checkParts(record: Buffer, number: number): void {
  if (record.length < FIRST_PART) throw damaged(number);
  const parts = record.readInt32LE(PARTS_AT);
  const points = record.readInt32LE(PARTS_AT + 4);
  if (parts < 1 || parts > MOST_PARTS || points < 1) throw damaged(number);
  if (FIRST_PART + 4 * parts + 16 * points > record.length) throw damaged(number);
  let before = -1;
  for (let k = 0; k < parts; k += 1) {
    const first = record.readInt32LE(FIRST_PART + 4 * k);
    if (first <= before || first >= points) throw damaged(number);
    before = first;
  }
}

/** Looks through a file of shapes before it is read: how many there are, and that each is whole. */
export function checkShapes(shp: Buffer): void {
  if (shp.length < HEADING) throw damaged(0);
  let number = 0;
  for (let at = HEADING; at + RECORD_HEADING < shp.length;) {
    number += 1;
    if (number > BACKGROUND_LIMITS.features) {
      throw new AppError('too-large', 'The file holds more than 200,000 shapes.');
    }
    const length = 2 * shp.readInt32BE(at + 4);
    const start = at + RECORD_HEADING;
    if (length < 4 || start + length > shp.length) throw damaged(number);
    const type = shp.readInt32LE(start);
    if (WITH_PARTS.includes(type)) checkParts(shp.subarray(start, start + length), number);
    else if (type !== NULL_SHAPE) {
      throw new AppError('unreadable', 'The file holds shapes that are neither lines nor areas.');
    }
    at = start + length;
  }
}
