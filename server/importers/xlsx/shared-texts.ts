import { AppError } from '../../errors.ts';
import { eventsOf, type Parts } from './workbook-parts.ts';

const MOST_TEXTS = 5_000_000;
const MOST_LETTERS = 200 * 1024 * 1024;

/** The texts that cells refer to by number; how letters look and how they are spoken is left out. */
export async function sharedTexts(parts: Parts): Promise<readonly string[]> {
  const texts: string[] = [];
  let [text, letters] = ['', 0];
  let [isText, isSpoken] = [false, false];
  for await (const event of eventsOf(parts, 'xl/sharedStrings.xml')) {
    if (event.kind === 'text') {
      if (isText && !isSpoken) text += event.text;
    } else if (event.name === 't') isText = event.kind === 'open';
    else if (event.name === 'rPh') isSpoken = event.kind === 'open';
    else if (event.name === 'si' && event.kind === 'close') {
      letters += text.length;
      if (texts.length >= MOST_TEXTS || letters > MOST_LETTERS) {
        throw new AppError('too-large', 'The workbook holds too many texts.');
      }
      texts.push(text);
      text = '';
    }
  }
  return texts;
}
