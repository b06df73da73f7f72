/**
 * How a wall of some construction answers to bending and shear.
 *
 * Units: none. Valid: made by `stiffnessOfConstruction`. Source: [own].
 */
export type Stiffness = {
  readonly eOverG: number;
  readonly poisson: number;
  /** A key of REFERENCES, or common practice. */
  readonly source: 'burland-wroth-1974' | 'common practice';
};

const MASONRY: Stiffness = { eOverG: 2.6, poisson: 0.3, source: 'burland-wroth-1974' };
const FRAMED: Stiffness = { eOverG: 12.5, poisson: 0.3, source: 'common practice' };

const BY_CONSTRUCTION: Readonly<Record<string, Stiffness>> = {
  masonry: MASONRY,
  framed: FRAMED,
  'steel framed': FRAMED,
  'concrete framed': FRAMED,
  'timber framed': FRAMED,
};

/**
 * The constructions whose stiffness is known, as they are written after hyphens became blanks.
 *
 * Units: none. Valid: small letters. Source: [own].
 */
export const STIFF_CONSTRUCTIONS: readonly string[] = Object.keys(BY_CONSTRUCTION);

/**
 * Stiffness by construction: masonry has E/G 2.6, frames 12.5, both Poisson's ratio 0.3.
 *
 * Units: none. Valid: any words, capitals and hyphens make no difference; undefined where they are not
 * among those known, and the method has to assume a stiffness. Source: burland-wroth-1974; frames [common].
 */
export function stiffnessOfConstruction(construction: string | null): Stiffness | undefined {
  const words = construction?.replaceAll('-', ' ').trim().toLowerCase() ?? '';
  return Object.hasOwn(BY_CONSTRUCTION, words) ? BY_CONSTRUCTION[words] : undefined;
}
