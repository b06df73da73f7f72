import { inviteFirstAdministrator } from './commands/invite-first-administrator.ts';
import { readEnv } from './env.ts';
import { openServices } from './open-services.ts';
import { report } from './report.ts';

/** Asks the first administrator in, where there is none who can sign in, and says how things stand. */
async function firstAdministrator(): Promise<void> {
  const env = readEnv(process.env);
  const { FIRST_ADMINISTRATOR: email, FIRST_ADMINISTRATOR_NAME: name } = env;
  const { services, closeServices } = await openServices(env);
  try {
    const wanted = email === undefined ? undefined : { email, name };
    report(await inviteFirstAdministrator(services, wanted));
  } finally {
    await closeServices();
  }
}

await firstAdministrator();
