import type { Block } from './block.ts';

type Area = { readonly left: number; readonly top: number; readonly bottom: number };

/** Puts blocks one under the other, on new pages where they have no room left. */
export class Flow {
  readonly #area: Area;
  readonly #addPage: () => void;
  readonly #isDrawn: boolean;
  #y: number;

  /** What is not drawn only takes its room, so that pages can be counted before there are any. */
  constructor(area: Area, addPage: () => void, isDrawn = true) {
    this.#area = area;
    this.#addPage = addPage;
    this.#isDrawn = isDrawn;
    this.#y = area.top;
    addPage();
  }

  /** Where the next block will stand on its page. */
  get y(): number {
    return this.#y;
  }

  /** Whether there is still room on this page; on an empty one there always is. */
  hasRoom(height: number): boolean {
    return this.#y === this.#area.top || this.#y + height <= this.#area.bottom;
  }

  turn(): void {
    this.#addPage();
    this.#y = this.#area.top;
  }

  put(block: Block): void {
    if (!this.hasRoom(block.height)) this.turn();
    if (this.#isDrawn) block.draw(this.#area.left, this.#y);
    this.#y += block.height;
  }

  /** Leaves room, except at the head of a page. */
  space(height: number): void {
    if (this.#y > this.#area.top) this.#y += height;
  }
}
