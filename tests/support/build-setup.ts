import { runScript } from './running-app.ts';

/** Builds once what several applications are going to start from at the same time. */
export default async function setUp(): Promise<void> {
  const { ended, output } = runScript('build');
  if ((await ended) !== 0) throw new Error(`The application cannot be built:\n${output()}`);
}
