import { Refusal } from './refusal.mjs';

const NOBODY = `Nobody can sign in yet: there is no administrator. Say who is the first one:
  DEMO=false FIRST_ADMINISTRATOR=name@your.domain npm start
They get a link to choose a password, which is shown here too.`;

/** Sees to an administrator who can sign in, or can choose a password by the link that is given. */
export async function askInFirstAdministrator(run) {
  const { state, email, url } = await run('first-administrator');
  switch (state) {
    case 'missing':
      throw new Refusal(NOBODY);
    case 'awaited':
      return {
        said: `${email} has no password yet; FIRST_ADMINISTRATOR=${email} makes a new link`,
      };
    case 'promoted':
      return { said: `${email} is administrator now` };
    case 'invited':
      return {
        said: `${email} is asked in by letter`,
        invitation: { email, url },
      };
    default:
      return { said: 'there' };
  }
}
