/** What a request knows of the person who sent it, and no more than that. */
export function userOf({ id, name, email, isAdministrator }: Express.User): Express.User {
  return { id, name, email, isAdministrator };
}
