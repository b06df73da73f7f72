import type { Visitor } from './visitor.ts';

/** A photograph as a camera would give it, larger than what is sent: a wall with a crack. */
export async function aPhotograph({ page }: Visitor): Promise<Buffer> {
  const text = await page.evaluate(() => {
    const canvas = Object.assign(document.createElement('canvas'), { width: 3000, height: 2000 });
    const context = canvas.getContext('2d');
    context?.fillRect(0, 0, 3000, 1000);
    return canvas.toDataURL('image/jpeg').split(',')[1] ?? '';
  });
  return Buffer.from(text, 'base64');
}

type Seen = { readonly place: string; readonly width: string; readonly notes: string };

/** Fills in a visit from outside, with a defect. */
export async function fillVisit({ page }: Visitor, { place, width, notes }: Seen): Promise<void> {
  await page.getByRole('button', { name: 'Outside' }).click();
  await page.getByLabel('Condition').fill('poor');
  await page.getByRole('button', { name: 'Add a defect' }).click();
  await page.getByLabel('Where', { exact: true }).fill(place);
  await page.getByLabel('Width, mm').fill(width);
  await page.getByLabel('What else you saw').fill(notes);
}

/** Takes a photograph with the phone, and says what is on it. */
export async function takePhotograph(visitor: Visitor, file: Buffer, caption: string) {
  const { page } = visitor;
  const photograph = { name: 'taken.jpg', mimeType: 'image/jpeg', buffer: file };
  await page.locator('input[type=file][capture]').setInputFiles(photograph);
  await page.getByLabel('Caption').last().fill(caption);
}

/** The controls of the page that are too small for a thumb, by what they are called. */
export function smallTargets({ page }: Visitor): Promise<string[]> {
  return page.getByRole('main').evaluate((main) => {
    const controls = main.querySelectorAll('a, button, input, select, textarea, summary');
    return [...controls].flatMap((element) => {
      const { width, height } = (element.closest('label') ?? element).getBoundingClientRect();
      return width > 0 && height < 44 ? [element.outerHTML.slice(0, 80)] : [];
    });
  });
}
