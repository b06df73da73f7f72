import type { LetterKind } from '../schemas/letter-settings.ts';
import type { LetterWords } from './letter-text.ts';

const END = `Please keep in mind:

{cautions}

If anything is not clear, please ask us: {contact}.`;

const PAGE = `On your own page you can read all of this at any time, choose a day, ask us, and tell us what worries you.

{link}`;

/**
 * The letters that a scheme starts with: plain words, what happens next, by when, whom to ask.
 *
 * Units: none. Valid: read only; an administrator writes later versions. Source: [own].
 */
export const DEFAULT_TEMPLATES: Readonly<Record<LetterKind, LetterWords>> = {
  'first information': {
    subject: 'A new tunnel near {place}',
    body: `Dear {name},

A new tunnel is planned near {place}. This letter tells you what that means for you. It is about:

{buildings}

{movement} {looks} {repairs}

{stays}

{sure}

What happens, and when:

{dates}

We ask you for one thing now. Please tell us by {answer by} that this letter has reached you.

${PAGE}

${END}`,
  },
  'condition survey': {
    subject: 'We would like to look at {place} before we tunnel',
    body: `Dear {name},

Before we tunnel, we would like to look at {place}. We take a picture of each room and note each crack. You get a copy. It helps us both: if a new crack shows later, we can all see that it is new.

It is about:

{buildings}

The visit takes about an hour. Please choose a day with us by {answer by}. You can be there, or send somebody.

${PAGE}

{movement} {looks} {repairs}

{sure}

${END}`,
  },
  'access request': {
    subject: 'May we come in to {place}?',
    body: `Dear {name},

We have looked at what the tunnel could do here. To be sure, an engineer has to come and look from the inside. It is about:

{buildings}

{movement} {looks} {repairs}

{sure}

The engineer looks at the walls, the floors and the cellar. That takes about two hours. Nothing is opened up unless you say so. Please let us know by {answer by} which day suits you.

${PAGE}

${END}`,
  },
  'when the tunnel passes': {
    subject: 'The tunnel will soon pass {place}',
    body: `Dear {name},

The tunnel will soon pass near {place}. This is what you can expect. It is about:

{buildings}

You may hear a low hum for some days, most of all at night. {movement} {looks} {repairs}

{stays}

{sure}

What happens, and when:

{dates}

We measure the ground all the time. If you see a new crack, or a door sticks, tell us at once.

Please tell us by {answer by} that this letter has reached you.

${PAGE}

${END}`,
  },
  'decision and measures': {
    subject: 'What we will do for {place}',
    body: `Dear {name},

We have looked closely at {place}, and an engineer has checked what we found. It is about:

{buildings}

{decision}

This is what we will do:

{measures}

{repairs}

{movement} {looks}

{sure}

What happens, and when:

{dates}

Please tell us by {answer by} that this letter has reached you. If you do not agree, tell us why. We will answer you.

${PAGE}

${END}`,
  },
  'free text': {
    subject: 'About {place}',
    body: `Dear {name},

We write to you about:

{buildings}

Here is what we have to say to you.

${PAGE}

${END}`,
  },
};
