import { withRightShift } from './turned-shifts.ts';

/**
 * Published shifts to WGS 84 that stand in for grids of shifts, which are too large to carry. Good to
 * some metres, and only where a scheme lies on the map hangs on it: footprints stay in the scheme's grid.
 */
const SHIFTS: Readonly<Record<string, string>> = {
  'OSTN15_NTv2_OSGBtoETRS.gsb': '446.448,-125.157,542.06,0.15,0.247,0.842,-20.489',
  'BETA2007.gsb': '598.1,73.7,418.2,0.202,0.045,-2.455,6.7',
  'nzgd2kgrid0005.gsb': '59.47,-5.04,187.44,0.47,-0.1,1.024,-4.5993',
  'National 84 (02.07.01).gsb': '-134,-48,149,0,0,0,0',
  'NTv2_0.gsb': '-10,158,187,0,0,0,0',
  'CA61_003.gsb': '-206,172,-6,0,0,0,0',
  'CA7072_003.gsb': '-206,172,-6,0,0,0,0',
};

/** "@null" asks for no grid, which proj4 knows. */
const GRIDS = /\+nadgrids=(?!@null)(?:"([^"]*)"|(\S+))/;

/** A definition that proj4 can use without files beside it; undefined where there is no stand-in. */
export function mapDefinition(definition: string): string | undefined {
  const found = GRIDS.exec(definition);
  if (found === null) return withRightShift(definition);
  const shift = SHIFTS[found[1] ?? found[2] ?? ''];
  return shift === undefined ? undefined : definition.replace(GRIDS, `+towgs84=${shift}`);
}
