import type { KeptVisit } from './kept-visit.ts';

/** Where visits stay on this phone until they are sent, photographs with them. */
export type VisitStore = {
  readonly all: () => Promise<readonly KeptVisit[]>;
  readonly put: (visit: KeptVisit) => Promise<void>;
  /** With its photographs. */
  readonly remove: (visit: KeptVisit) => Promise<void>;
  readonly photograph: (id: string) => Promise<Blob | undefined>;
  readonly putPhotograph: (id: string, file: Blob) => Promise<void>;
  readonly removePhotograph: (id: string) => Promise<void>;
};
