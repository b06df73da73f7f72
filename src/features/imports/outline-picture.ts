type Corner = readonly [longitude: number, latitude: number];
type Outline = readonly (readonly (readonly Corner[])[])[];

export type OutlinePicture = { readonly viewBox: string; readonly paths: readonly string[] };

const SIZE = 120;
const MARGIN = 8;

function figures(value: number): string {
  return String(Math.round(value * 100) / 100);
}

/** Outlines of the same place as paths of one small picture, north up and true in shape. */
export function outlinePicture(outlines: readonly Outline[]): OutlinePicture {
  const corners = outlines.flat(3);
  const [longitudes, latitudes] = [corners.map(([x]) => x), corners.map(([, y]) => y)];
  const [west, south] = [Math.min(...longitudes), Math.min(...latitudes)];
  const [east, north] = [Math.max(...longitudes), Math.max(...latitudes)];
  const narrowing = Math.cos((((south + north) / 2) * Math.PI) / 180);
  const widest = Math.max((east - west) * narrowing, north - south, 1e-9);
  const scale = (SIZE - 2 * MARGIN) / widest;
  const width = figures((east - west) * narrowing * scale + 2 * MARGIN);
  const height = figures((north - south) * scale + 2 * MARGIN);

  function place([longitude, latitude]: Corner): string {
    const x = (longitude - west) * narrowing * scale + MARGIN;
    return `${figures(x)} ${figures((north - latitude) * scale + MARGIN)}`;
  }
  return {
    viewBox: `0 0 ${width} ${height}`,
    paths: outlines.map((outline) =>
      outline
        .flat()
        .map((ring) => `M${ring.map(place).join('L')}Z`)
        .join(''),
    ),
  };
}
