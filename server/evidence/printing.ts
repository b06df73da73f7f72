import type { Sequelize } from 'sequelize';
import type { FoundPrint } from '../models/prints.ts';
import type { Scheme } from '../models/scheme.ts';

/** A print that is being made, and the file it is written to. */
export type Printing = {
  readonly database: Sequelize;
  readonly scheme: Scheme;
  readonly print: FoundPrint;
  readonly file: string;
  /** Told before each sheet how many are done, of how many; throws where the print is to stop. */
  readonly onSheet: (done: number, sheets: number) => Promise<void>;
};

/** Writes the file of a print; gives how many sheets it has. */
export type Printer = (printing: Printing) => Promise<number>;
