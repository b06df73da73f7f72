import Excel from 'exceljs';

/** What a file is sent as. */
export function bytesOf(body: unknown): Buffer {
  if (!Buffer.isBuffer(body)) throw new Error('A file is bytes.');
  return body;
}

/** A workbook out of what was sent. */
export async function bookOf(body: unknown): Promise<Excel.Workbook> {
  const book = new Excel.Workbook();
  const { buffer, byteOffset, byteLength } = bytesOf(body);
  await book.xlsx.load(new Uint8Array(buffer, byteOffset, byteLength).slice().buffer);
  return book;
}

export type Cells = Readonly<Record<string, Excel.CellValue>>;

/** The rows of a sheet by what stands over them. */
export function tableOf(book: Excel.Workbook, name: string): Cells[] {
  const sheet = book.getWorksheet(name);
  const heads = (sheet?.getRow(1).values ?? []) as (string | undefined)[];
  const found: Cells[] = [];
  sheet?.eachRow((row, k) => {
    if (k === 1) return;
    found.push(
      Object.fromEntries(
        heads.flatMap((head, column) =>
          head === undefined ? [] : [[head, row.getCell(column).value]],
        ),
      ),
    );
  });
  return found;
}
