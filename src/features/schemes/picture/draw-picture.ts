import type { VectorTileFeature } from '@mapbox/vector-tile';
import { MAP_COLOURS } from '../../map/style/map-colours.ts';
import type { Picture, PictureLayer } from './load-picture.ts';
import type { PlacedTile } from './picture-frame.ts';
import type { Look } from './picture-looks.ts';

const LINE = 2;
const POLYGON = 3;

function isMeant({ kinds }: Look, { properties }: VectorTileFeature): boolean {
  return kinds === undefined || kinds.includes(String(properties.kind));
}

function pathOf(feature: VectorTileFeature, { left, top, side }: PlacedTile): Path2D {
  const path = new Path2D();
  const scale = side / feature.extent;
  for (const ring of feature.loadGeometry()) {
    for (const [index, { x, y }] of ring.entries()) {
      if (index === 0) path.moveTo(left + x * scale, top + y * scale);
      else path.lineTo(left + x * scale, top + y * scale);
    }
  }
  return path;
}

function drawFeature(
  context: CanvasRenderingContext2D,
  feature: VectorTileFeature,
  { place, look, pixelsPerMetre }: { place: PlacedTile; look: Look; pixelsPerMetre: number },
): void {
  const { fill, line, width = 1 } = look;
  const path = pathOf(feature, place);
  if (feature.type === POLYGON && fill !== undefined) {
    context.fillStyle = fill;
    context.fill(path, 'evenodd');
  }
  const isOutline = feature.type === POLYGON && look.layer === 'buildings';
  if (line !== undefined && (feature.type === LINE || isOutline)) {
    const own = feature.properties.width;
    context.strokeStyle = line;
    context.lineWidth = (typeof own === 'number' ? own : width) * pixelsPerMetre;
    context.stroke(path);
  }
}

function drawLayer(
  context: CanvasRenderingContext2D,
  { looks, sheets }: PictureLayer,
  pixelsPerMetre: number,
): void {
  for (const look of looks) {
    for (const { tile, place } of sheets) {
      const layer = tile.layers[look.layer];
      for (let index = 0; index < (layer?.length ?? 0); index += 1) {
        const feature = layer?.feature(index);
        if (feature === undefined || !isMeant(look, feature)) continue;
        drawFeature(context, feature, { place, look, pixelsPerMetre });
      }
    }
  }
}

/** Draws a picture on a canvas of its size, as sharp as the screen is. */
export function drawPicture(canvas: HTMLCanvasElement, { frame, layers }: Picture): void {
  const context = canvas.getContext('2d');
  if (context === null) return;
  const sharpness = window.devicePixelRatio;
  canvas.setAttribute('width', String(frame.width * sharpness));
  canvas.setAttribute('height', String(frame.height * sharpness));
  context.scale(sharpness, sharpness);
  context.fillStyle = MAP_COLOURS.land;
  context.fillRect(0, 0, frame.width, frame.height);
  context.lineCap = 'round';
  context.lineJoin = 'round';
  for (const layer of layers) drawLayer(context, layer, frame.pixelsPerMetre);
}
