import type { Import } from '../support/imports.ts';

const NUMBERS = ['units', 'numerics'];
const PLANE = [...NUMBERS, 'geometry'];
const PARTS = [...PLANE, 'ground', 'building', 'damage'];

/** What a folder of shared may import besides itself and the leaves that stand beside the folders. */
const BEFORE: Readonly<Record<string, readonly string[]>> = {
  units: [],
  numerics: ['units'],
  geometry: NUMBERS,
  ground: PLANE,
  building: PLANE,
  damage: PLANE,
  assessment: PARTS,
  monitoring: PARTS,
  schemas: [...PLANE, 'damage'],
  presentation: [...PARTS, 'assessment', 'schemas'],
  evidence: [...PARTS, 'assessment', 'schemas', 'presentation'],
  checks: [...PARTS, 'assessment', 'monitoring', 'schemas'],
};

/** What it may import as types only. */
const TYPES_BEFORE: Readonly<Record<string, readonly string[]>> = { assessment: ['schemas'] };

const LEAF = '';

/** The folder inside shared; a leaf module stands in none. */
function folderOf(file: string): string | undefined {
  return /^shared\/(?:([^/]+)\/)?[^/]*$|^shared\/([^/]+)\//.exec(file)?.slice(1).join('');
}

function faultOf({ from, target, package: name, typeOnly }: Import): string | undefined {
  const folder = folderOf(from);
  if (folder === undefined) return undefined;
  if (folder !== LEAF && !(folder in BEFORE)) return `${folder} has no place in the order`;
  if (name === 'zod' && folder !== 'schemas') return 'zod belongs to schemas';
  const other = target === undefined ? undefined : folderOf(target);
  if (other === undefined || other === folder || other === LEAF) return undefined;
  if (BEFORE[folder]?.includes(other) === true) return undefined;
  if (TYPES_BEFORE[folder]?.includes(other) === true) {
    return typeOnly ? undefined : `${folder} may import only types of ${other}`;
  }
  return `${folder === LEAF ? 'a leaf' : folder} may not import ${other}`;
}

/** Imports inside shared against its order: units, numerics, geometry, the three parts, assessment. */
export function orderFaults(imports: readonly Import[]): string[] {
  return imports.flatMap((one) => {
    const fault = faultOf(one);
    return fault === undefined ? [] : [`${one.place} ${fault}`];
  });
}
