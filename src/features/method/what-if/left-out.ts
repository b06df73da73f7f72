/** What a what-if leaves out of the wall of a sheet, by the short names that stand in the address. */
export const LEFT_OUT = {
  drives: 'The line has two drives. Only the nearer one is here.',
  bends: 'The drive bends near this wall. Here it is straight.',
  climbs:
    'The drive climbs or falls near this wall. Here it is level, as deep as beside the middle of the wall.',
  inputs:
    'Volume loss, K or diameter change along the drive near this wall. Here they are those beside the middle of the wall.',
  ends: 'The drive ends near this wall. Here it goes on.',
  rules: 'The run went by rules of its own. Here the rules are those that a scheme starts with.',
} as const;

/** Something that a what-if leaves out of the wall of a sheet. */
export type LeftOut = keyof typeof LEFT_OUT;

function isLeftOut(name: string): name is LeftOut {
  return name in LEFT_OUT;
}

/** What of a list of names there is, each once and in the order in which it is said. */
export function leftOutOf(names: readonly string[]): readonly LeftOut[] {
  return Object.keys(LEFT_OUT)
    .filter(isLeftOut)
    .filter((name) => names.includes(name));
}
