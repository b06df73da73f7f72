import PDFDocument from 'pdfkit';
import { openFaces, type Faces } from './faces.ts';
import { PAGE_SIZES } from './page-sizes.ts';

/** What is drawn and written on: a document with its fonts. */
export type Paper = { readonly doc: PDFKit.PDFDocument; readonly faces: Faces };

/** What a document says of itself. */
export type PaperFacts = {
  readonly title: string;
  readonly author: string;
  readonly subject: string;
  readonly at: Date;
};

type PaperOptions = PaperFacts & {
  /** Of pages that do not say how large they are. */
  readonly size?: keyof typeof PAGE_SIZES;
  /** Whether pages stay open until the document ends, so that each can say how many there are. */
  readonly isKept?: boolean;
};

/** An empty document. */
export function openPaper(options: PaperOptions): Paper {
  const { size = 'A4', isKept = true, title, author, subject, at } = options;
  const { width, height } = PAGE_SIZES[size];
  const doc = new PDFDocument({
    size: [width, height],
    margin: 0,
    autoFirstPage: false,
    bufferPages: isKept,
    pdfVersion: '1.7',
    lang: 'en-GB',
    displayTitle: true,
    info: {
      Title: title,
      Author: author,
      Subject: subject,
      Creator: 'Groundsill',
      Producer: 'Groundsill',
      CreationDate: at,
      ModDate: at,
    },
  });
  return { doc, faces: openFaces(doc) };
}

/** Ends a document and gives its bytes. */
export async function bytesOf({ doc }: Paper): Promise<Uint8Array> {
  const parts: Buffer[] = [];
  const ended = new Promise<void>((resolve, reject) => {
    doc.on('data', (part: Buffer) => parts.push(part));
    doc.on('end', resolve);
    doc.on('error', reject);
  });
  doc.end();
  await ended;
  return new Uint8Array(Buffer.concat(parts));
}
