import { ownerHomeUrl } from './owner-home-url.ts';
import type { OutgoingMail } from '../outbox.ts';
import { nearDayInWords } from './day-in-words.ts';

type Reader = { readonly name: string; readonly email: string };

type MatterFacts = {
  readonly publicUrl: string;
  readonly schemeId: string;
  readonly partyId: string;
  readonly to: Reader;
  readonly title: string;
};

/** A text as paragraphs of a mail. */
function paragraphs(text: string): string[] {
  return text.split(/\n+/).filter((line) => line.trim() !== '');
}

/** Tells an owner that what they wrote has arrived, and by when it is answered. */
export function matterReceivedMail(
  facts: MatterFacts & {
    readonly isConcern: boolean;
    /** The day that was promised; null where it has passed. */
    readonly due: string | null;
  },
): OutgoingMail {
  const { publicUrl, schemeId, partyId, to, title, isConcern, due } = facts;
  const danger =
    'If you think that somebody could get hurt, leave the building and call the emergency number first.';
  return {
    ...{ schemeId, partyId, recipient: to.email },
    subject: `We have your message: ${title}`,
    parts: [
      `${to.name},`,
      due === null
        ? 'Thank you. Our answer to you is late, and we are sorry. Your message is with the people who will answer.'
        : `Thank you. Someone will answer by ${nearDayInWords(due)}.`,
      ...(isConcern ? [danger] : []),
      { label: 'See what you wrote, and our answer when it is there', url: ownerHomeUrl(publicUrl, schemeId) }, // prettier-ignore
    ],
  };
}

/** Carries an answer of the team to an owner. */
export function matterAnsweredMail(facts: MatterFacts & { readonly text: string }): OutgoingMail {
  const { publicUrl, schemeId, partyId, to, title, text } = facts;
  return {
    ...{ schemeId, partyId, recipient: to.email },
    subject: `Our answer: ${title}`,
    parts: [
      `${to.name},`,
      `Here is our answer to what you wrote to us about “${title}”.`,
      ...paragraphs(text),
      'If something is not clear, write to us again on your page. You can see everything there.',
      { label: 'Open your page', url: ownerHomeUrl(publicUrl, schemeId) },
    ],
  };
}
