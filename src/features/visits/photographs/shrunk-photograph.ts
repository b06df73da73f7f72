import { fittedSize, type Size } from './fitted-size.ts';

const LONGEST = 2400;
const QUALITY = 0.85;

type Shrunk = Size & { readonly file: Blob };

function drawn(picture: ImageBitmap, size: Size): HTMLCanvasElement | null {
  const canvas = document.createElement('canvas');
  Object.assign(canvas, size);
  const context = canvas.getContext('2d');
  context?.drawImage(picture, 0, 0, size.width, size.height);
  return context === null ? null : canvas;
}

function asJpeg(canvas: HTMLCanvasElement): Promise<Blob | null> {
  return new Promise((resolve) => {
    canvas.toBlob(resolve, 'image/jpeg', QUALITY);
  });
}

/**
 * A photograph small enough to be sent from a street, upright, and without what the camera wrote of the
 * place; null where the browser cannot read it.
 */
export async function shrunkPhotograph(file: Blob): Promise<Shrunk | null> {
  const picture = await createImageBitmap(file, { imageOrientation: 'from-image' }).catch(() => null); // prettier-ignore
  if (picture === null) return null;
  const size = fittedSize(picture, LONGEST);
  const canvas = drawn(picture, size);
  picture.close();
  const small = canvas === null ? null : await asJpeg(canvas);
  return small === null ? null : { ...size, file: small };
}
