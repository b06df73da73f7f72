import { SaxesParser, type SaxesTagPlain } from 'saxes';
import { AppError } from '../../errors.ts';

/** What stands in a piece of XML, in order; names without their prefix. */
export type XmlEvent =
  | {
      readonly kind: 'open';
      readonly name: string;
      readonly attributes: SaxesTagPlain['attributes'];
    }
  | { readonly kind: 'text'; readonly text: string }
  | { readonly kind: 'close'; readonly name: string };

const LONGEST_TEXT = 2 * 1024 * 1024;

function localName(name: string): string {
  return name.slice(name.indexOf(':') + 1);
}

function refused(part: string, reason: string): AppError {
  return new AppError('unreadable', `The workbook cannot be read: "${part}" ${reason}.`);
}

/**
 * Reads XML piece by piece. Entities of its own are refused, since they can grow without end.
 */
export async function* readXml(
  part: string,
  chunks: AsyncIterable<Buffer>,
): AsyncGenerator<readonly XmlEvent[]> {
  let events: XmlEvent[] = [];
  const parser = new SaxesParser();
  parser.on('doctype', () => {
    throw refused(part, 'declares entities of its own');
  });
  parser.on('error', () => {
    throw refused(part, 'is damaged');
  });
  parser.on('opentag', ({ name, attributes }) => {
    events.push({ kind: 'open', name: localName(name), attributes });
  });
  parser.on('closetag', ({ name }) => {
    events.push({ kind: 'close', name: localName(name) });
  });
  parser.on('text', (text) => {
    events.push({ kind: 'text', text });
  });
  const decoder = new TextDecoder();
  let waiting = 0;
  for await (const chunk of chunks) {
    parser.write(decoder.decode(chunk, { stream: true }));
    waiting = events.length === 0 ? waiting + chunk.length : 0;
    if (waiting > LONGEST_TEXT) throw refused(part, 'has a text longer than 2 MB');
    yield events;
    events = [];
  }
  parser.close();
  yield events;
}
