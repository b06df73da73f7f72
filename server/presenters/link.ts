import type { LinkAnswer } from '../../shared/schemas/links.ts';
import type { Person } from '../models/person.ts';
import type { SingleUseLink } from '../models/single-use-link.ts';

/** What somebody with a link may know before they use it. */
export function presentLink({
  link,
  person,
}: {
  readonly link: SingleUseLink;
  readonly person: Person;
}): LinkAnswer {
  return { purpose: link.purpose, email: person.email, name: person.name };
}
