import type { Board } from '#core/board/document.ts';
import type { Rail } from '#core/electrical/rail-table.ts';

/** A supply or a rail in the tree of feeds, with its place: `column` feeds from the root, `row` from the top. */
export type FeedNode = {
  key: string;
  name: string;
  rail: Rail | null;
  column: number;
  row: number;
  fed: FeedNode[];
};

/**
 * Supplies with the rails that they feed, and rails without a feed as roots of their own. Leaves take a row each; what feeds
 * several stands on the row of its first.
 */
export function feedTree(board: Board, rails: readonly Rail[]): FeedNode[] {
  let nextRow = 0;
  const place = (key: string, name: string, rail: Rail | null, below: readonly Rail[], column: number): FeedNode => {
    const row = nextRow;
    const fed = below.map((child) => placeRail(child, column + 1));
    if (fed.length === 0) nextRow += 1;
    return { key, name, rail, column, row, fed };
  };
  const feedOf = (rail: Rail) => board.regulators.find(({ ref }) => ref === rail.ref)?.feed ?? null;
  const placeRail = (rail: Rail, column: number): FeedNode => {
    const below = rails.filter((candidate) => {
      const feed = feedOf(candidate);
      return feed !== null && 'regulator' in feed && feed.regulator === rail.ref;
    });
    return place(`rail ${rail.ref}`, rail.ref, rail, below, column);
  };
  const supplies = board.supplies.map(({ name }) => {
    const below = rails.filter((rail) => {
      const feed = feedOf(rail);
      return feed !== null && 'supply' in feed && feed.supply === name;
    });
    return place(`supply ${name}`, name, null, below, 0);
  });
  return [...supplies, ...rails.filter((rail) => feedOf(rail) === null).map((rail) => placeRail(rail, 0))];
}

/** Every node of a tree, each before those that it feeds. */
export function feedNodes(roots: readonly FeedNode[]): FeedNode[] {
  return roots.flatMap((node) => [node, ...feedNodes(node.fed)]);
}
