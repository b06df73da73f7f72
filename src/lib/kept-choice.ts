import type { z } from 'zod';

function nameOf(key: string): string {
  return `groundsill.${key}`;
}

/** A choice that this browser keeps; undefined where it keeps none or what it keeps makes no sense. */
export function readKept<T>(key: string, schema: z.ZodType<T>): T | undefined {
  const text = localStorage.getItem(nameOf(key));
  if (text === null) return undefined;
  try {
    return schema.safeParse(JSON.parse(text)).data;
  } catch {
    return undefined;
  }
}

/** Keeps a choice in this browser. */
export function writeKept(key: string, value: unknown): void {
  localStorage.setItem(nameOf(key), JSON.stringify(value));
}
