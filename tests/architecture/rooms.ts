import type { Import } from '../support/imports.ts';

const ROOMS = ['shared', 'server', 'src', 'scripts', 'tests'] as const;
type Room = (typeof ROOMS)[number];

/** Which rooms may look into which. */
const MAY_IMPORT: Readonly<Record<Room, readonly Room[]>> = {
  shared: ['shared'],
  server: ['server', 'shared'],
  src: ['src', 'shared'],
  scripts: ['scripts', 'shared', 'server'],
  tests: ROOMS,
};

const PACKAGES_OF_SHARED = ['zod', 'd3-contour', 'flatbush'];

function roomOf(file: string): Room | undefined {
  return ROOMS.find((room) => file.startsWith(`${room}/`));
}

function faultOf({ from, target, package: name }: Import): string | undefined {
  const room = roomOf(from);
  if (room === undefined) return 'stands in no room';
  if (name !== undefined) {
    const allowed = room !== 'shared' || PACKAGES_OF_SHARED.includes(name);
    return allowed ? undefined : `shared may not import ${name}`;
  }
  if (target === undefined) return undefined;
  if (!/\.\w+(\?[\w&]+)?$/.test(target)) return `${target} is not named with its extension`;
  const other = roomOf(target);
  if (other !== undefined && MAY_IMPORT[room].includes(other)) return undefined;
  return room === 'tests' ? undefined : `${room} may not import ${target}`;
}

/** Imports from a room that the importing room may not know. */
export function roomFaults(imports: readonly Import[]): string[] {
  return imports.flatMap((one) => {
    const fault = faultOf(one);
    return fault === undefined ? [] : [`${one.place} ${fault}`];
  });
}

/** What `scripts/*.mjs` imports at once, before any package is there, beyond node's own modules. */
export function startFaults(imports: readonly Import[]): string[] {
  return imports
    .filter(({ from, late }) => /^scripts\/[^/]+\.mjs$/.test(from) && !late)
    .filter(({ target, package: name }) =>
      target === undefined
        ? name?.startsWith('node:') !== true
        : !/^scripts\/[^/]+\.mjs$/.test(target),
    )
    .map(
      ({ place, target, package: name }) => `${place} imports ${target ?? name ?? ''} too early`,
    );
}
