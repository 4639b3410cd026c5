import type { Board } from '#core/board/document.ts';
import type { FeedNode } from './feed-tree.ts';
import { feedSentence } from './feed-words.ts';

/** The tree of feeds in words: the drawing's twin. */
export function TreeList({ board, nodes }: { board: Board; nodes: readonly FeedNode[] }) {
  return (
    <ul className="list-disc pl-6">
      {nodes.map((node) => (
        <li key={node.key}>
          {feedSentence(board, node)}
          {node.fed.length > 0 ? <TreeList board={board} nodes={node.fed} /> : null}
        </li>
      ))}
    </ul>
  );
}
