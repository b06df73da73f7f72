import { placeInPicture, type PictureFrame } from '../../schemes/picture/picture-frame.ts';

/** Places of the world as the corners of a path in a picture, without its beginning. */
export function pathOf(
  frame: PictureFrame,
  places: readonly (readonly [number, number])[],
): string {
  return places
    .map((at) =>
      placeInPicture(frame, at)
        .map((pixels) => pixels.toFixed(1))
        .join(' '),
    )
    .join('L');
}
