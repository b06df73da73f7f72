import type { SchemeAnswer } from '../../../shared/schemas/schemes.ts';

/** Whether the server lets the person do something in a scheme; it says so with every scheme. */
export function can({ abilities }: Pick<SchemeAnswer, 'abilities'>, action: string): boolean {
  return abilities[action] === true;
}
