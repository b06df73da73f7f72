import type { StreetClass } from './main-streets.ts';
import type { Random } from './prng.ts';

const words = [
  'Anchor', 'Anvil', 'Ballast', 'Barrel', 'Basket', 'Beacon', 'Bell', 'Billet', 'Block', 'Bobbin', 'Bollard', 'Bowline', 'Brine',
  'Buoy', 'Cable', 'Candle', 'Canvas', 'Capstan', 'Caulker', 'Chandler', 'Chart', 'Cinder', 'Cleat', 'Coble', 'Compass', 'Cooper',
  'Copper', 'Cordage', 'Cork', 'Creel', 'Crow’s Nest', 'Curlew', 'Cutter', 'Davit', 'Driftwood', 'Eel', 'Fathom', 'Fender', 'Ferry', 'Fid', 'Flagstaff',
  'Flax', 'Flint', 'Foghorn', 'Foresail', 'Furnace', 'Gaff', 'Galley', 'Gannet', 'Gimlet', 'Grapnel', 'Gull', 'Gunwale', 'Halyard',
  'Harpoon', 'Hatch', 'Hawser', 'Hemp', 'Herring', 'Hogshead', 'Jetsam', 'Jib', 'Keel', 'Keg', 'Kelp', 'Kettle', 'Kipper', 'Kittiwake', 'Ladle',
  'Lamp', 'Lantern', 'Lanyard', 'Leadline', 'Limpet', 'Linseed', 'Lobster', 'Loom', 'Lugger', 'Mackerel', 'Mallet', 'Mariner', 'Marlin', 'Mast',
  'Mercer', 'Millstone', 'Mizzen', 'Mole', 'Mussel', 'Needle', 'Net', 'Oakum', 'Oar', 'Osprey', 'Paddle', 'Paraffin', 'Pennant', 'Petrel', 'Pewter',
  'Pilchard', 'Pilot', 'Pitch', 'Plumb', 'Pulley', 'Purser', 'Quadrant', 'Quoin', 'Ratline', 'Reef', 'Rigger', 'Rope', 'Rudder', 'Sailmaker',
  'Salt', 'Sandpiper', 'Sawpit', 'Schooner', 'Scupper', 'Sextant', 'Shackle', 'Shipwright', 'Shrimp', 'Shuttle', 'Skate', 'Skipper', 'Slipway', 'Smack', 'Smithy',
  'Sounding', 'Spar', 'Spindle', 'Spinnaker', 'Spinner', 'Spirit', 'Splice', 'Sprat', 'Starboard', 'Staysail', 'Stockfish', 'Swell', 'Tackle', 'Tallow', 'Tar',
  'Tarpaulin', 'Tern', 'Thimble', 'Tide', 'Tiller', 'Timber', 'Tin', 'Topsail', 'Treenail', 'Truss', 'Tub', 'Turner', 'Twine', 'Wader', 'Warp', 'Weir',
  'Whelk', 'Wherry', 'Whetstone', 'Winch', 'Windlass', 'Yard', 'Yarn', 'Yawl',
] as const; // prettier-ignore

const endings: Record<StreetClass, readonly string[]> = {
  main: ['Road', 'Street', 'Gate'],
  quay: ['Quay', 'Quay', 'Wharf'],
  street: ['Street', 'Street', 'Street', 'Row', 'Hill', 'Terrace', 'Road'],
  lane: ['Lane', 'Lane', 'Passage', 'Entry', 'Wynd', 'Court'],
  square: ['Square'],
  bridge: ['Bridge'],
  track: ['Track'],
};

const before = [
  '',
  '',
  '',
  'Upper ',
  'Lower ',
  'Old ',
  'Great ',
  'Little ',
  'North ',
  'South ',
  'East ',
  'West ',
  'New ',
  'Far ',
] as const;

/** Gives each street a name that no other has. */
export function createNames(
  random: Random,
  taken: readonly string[],
): (kind: StreetClass) => string {
  const used = new Set(taken);
  let serial = 1;
  return (kind) => {
    const prefixes = used.size < 500 ? before.slice(0, 1) : before;
    for (let tries = 0; tries < 60; tries += 1) {
      const name = `${random.pick(prefixes)}${random.pick(words)} ${random.pick(endings[kind])}`;
      if (used.has(name)) continue;
      used.add(name);
      return name;
    }
    serial += 1;
    return `${random.pick(words)} ${random.pick(endings[kind])} ${serial}`;
  };
}

const signs = [
  'The Blue',
  'The Old',
  'The Merry',
  'The Grey',
  'The Silver',
  'The Lost',
  'The Brass',
  'The Patient',
  'The Dry',
  'The Second',
] as const;
const beasts = [
  'Anchor',
  'Cormorant',
  'Lantern',
  'Herring',
  'Mermaid',
  'Rope',
  'Skipper',
  'Bell',
  'Whelk',
  'Compass',
  'Eel',
  'Tar Barrel',
  'Lugger',
] as const;

export function innName(random: Random): string {
  return `${random.pick(signs)} ${random.pick(beasts)}`;
}

export function storeName(random: Random): string {
  return `${random.pick(words)} ${random.pick(['Store', 'Warehouse', 'Loft'])}`;
}
