/** Between the deepest pit and the highest town, as ground levels are bounded in the register. */
export const LOWEST_LEVEL = -500;
export const HIGHEST_LEVEL = 9000;

/** Whether the ground can be at a level. */
export function isLevel(level: number): boolean {
  return level >= LOWEST_LEVEL && level <= HIGHEST_LEVEL;
}
