import type { FootprintRings } from '../models/building-footprint.ts';

/** What a cell holds; null is unknown. */
export type ExportValue = string | number | null;

/** A column as a sheet has it: what stands over it, what it holds, and with how many digits it is shown. */
export type SheetColumn = {
  readonly heading: string;
  readonly kind: 'text' | 'number' | 'whole';
  readonly digits?: number;
};

/** A column of a file: by which name programs know it, and its value for people and for programs. */
export type ExportColumn<Row> = SheetColumn & {
  readonly name: string;
  readonly cell: (row: Row) => ExportValue;
  readonly property: (row: Row) => ExportValue | boolean;
};

/** A building on its way out; lonLat only where a format draws it. */
export type ExportedRow<Row> = {
  readonly reference: string;
  readonly row: Row;
  readonly lonLat: FootprintRings | undefined;
};

/** A small sheet beside the buildings. */
export type BesideSheet = {
  readonly title: string;
  readonly columns: readonly SheetColumn[];
  readonly rows: readonly (readonly ExportValue[])[];
};

/** What is said of a file, in pairs: Scheme, date, who. */
export type ExportAbout = readonly (readonly [label: string, value: string | number])[];

/** What is exported: buildings one after the other by their columns, and what is said about them. */
export type ExportFile<Row> = {
  readonly title: string;
  readonly columns: readonly ExportColumn<Row>[];
  readonly rows: AsyncIterable<ExportedRow<Row>>;
  readonly aboutTitle: string;
  readonly about: ExportAbout;
  readonly beside: readonly BesideSheet[];
};

/** What stands over a column, with its unit. */
export function headingWith({
  label,
  unit,
}: {
  readonly label: string;
  readonly unit?: string;
}): string {
  return unit === undefined ? label : `${label} (${unit})`;
}
