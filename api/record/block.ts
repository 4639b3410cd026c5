import type { Sheet } from './sheet.ts';

/** How one kind of block is set. */
export type BlockSetter<B> = {
  /** Height that must be left on a page for the block to begin there, so that no title stands alone. */
  lead(sheet: Sheet, block: B): number;
  draw(sheet: Sheet, block: B): void;
};
