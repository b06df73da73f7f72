import { AppError, type FieldFault } from '../errors.ts';

/** So many faults are told one by one; the others are counted. */
const MOST_TOLD = 50;
/** No word that is quoted is longer. */
const LONGEST_WORD = 30;

function counted(count: number): string {
  return count.toLocaleString('en-GB').replaceAll(',', ' ');
}

/** A word of a file as it is quoted. */
export function quoted(word: string): string {
  return `“${word.length > LONGEST_WORD ? `${word.slice(0, LONGEST_WORD)}…` : word}”`;
}

/** Gathers what is wrong with a file, place by place, so that all of it is told at once. */
export function createRowFaults() {
  const told: FieldFault[] = [];
  let count = 0;
  return {
    add: (where: string, why: string): void => {
      count += 1;
      const path = where.toLowerCase();
      if (count <= MOST_TOLD) told.push({ path, message: `${where}: ${why}` });
    },
    /** Refuses the file where anything is wrong with it. */
    refuse: (): void => {
      if (count === 0) return;
      const places = count === 1 ? 'One place' : `${counted(count)} places`;
      const listed = count > MOST_TOLD ? `; the first ${MOST_TOLD} are listed` : '';
      throw new AppError('unreadable', `${places} cannot be read${listed}.`, told);
    },
  };
}
