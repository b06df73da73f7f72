import { freePort, isFree } from '../postgres/ports.mjs';
import { Refusal } from './refusal.mjs';

/** The port to serve on: PORT, 4600 without one, any that is free for 0. */
export async function portToServeOn() {
  const wanted = Number(process.env.PORT ?? 4600);
  if (!Number.isInteger(wanted) || wanted < 0 || wanted > 65_535) {
    throw new Refusal(`PORT is ${process.env.PORT}; it must be a number from 0 to 65535.`);
  }
  if (wanted === 0) return freePort();
  if (await isFree(wanted)) return wanted;
  throw new Refusal(
    `Port ${wanted} is taken by another program. Stop that one, or choose another port:\n` +
      `  PORT=${wanted + 1} npm start`,
  );
}
