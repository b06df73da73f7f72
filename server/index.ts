import { createServer, type Server } from 'node:http';
import { createApp } from './app.ts';
import { recoverImports } from './commands/recover-imports.ts';
import { recoverPrints } from './commands/recover-prints.ts';
import { recoverRuns } from './commands/recover-runs.ts';
import { readEnv } from './env.ts';
import { seeToLetters } from './letters/see-to-letters.ts';
import { openServices } from './open-services.ts';
import { report } from './report.ts';
import { toldToStop } from './told-to-stop.ts';

/** How long requests in hand may take once the server is told to stop. */
const PATIENCE_MS = 5000;

function listen(server: Server, port: number, host: string): Promise<void> {
  return new Promise((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, host, resolve);
  });
}

function close(server: Server): Promise<void> {
  const patience = setTimeout(() => {
    server.closeAllConnections();
  }, PATIENCE_MS);
  return new Promise((resolve) => {
    server.close(() => {
      clearTimeout(patience);
      resolve();
    });
  });
}

/** Serves until told to stop, then answers what is in hand and closes what was opened. */
async function serve(): Promise<void> {
  const env = readEnv(process.env);
  const stop = toldToStop();
  const { services, pool, closeServices } = await openServices(env);
  await recoverImports(services);
  await recoverPrints(services);
  await recoverRuns(services);
  await services.outbox.recover();
  const stopSeeingToLetters = seeToLetters(services);
  const server = createServer(createApp(services, pool, process.cwd()));
  await listen(server, env.PORT, env.HOST);
  report({ listening: true });
  services.logger.info({ port: env.PORT }, 'listening');
  await stop;
  stopSeeingToLetters();
  await close(server);
  await closeServices();
  if (process.connected) process.disconnect();
}

await serve();
