import type { Board } from '#core/board/document.ts';
import { type FeedNode, feedNodes } from './feed-tree.ts';
import { feedSentence, feedWords } from './feed-words.ts';

const size = { width: 190, height: 68, columnGap: 56, rowGap: 18 };
const left = (node: FeedNode) => 2 + node.column * (size.width + size.columnGap);
const top = (node: FeedNode) => 2 + node.row * (size.height + size.rowGap);
const longest = 20;
const shortened = (name: string) => (name.length > longest ? `${name.slice(0, longest - 1)}…` : name);

/** Tree of feeds from left to right; every box takes the focus and is read as one sentence. A rail that is not held is dashed. */
export function TreeDrawing({ board, roots }: { board: Board; roots: readonly FeedNode[] }) {
  const nodes = feedNodes(roots);
  const width = Math.max(...nodes.map(left)) + size.width + 2;
  const height = Math.max(...nodes.map(top)) + size.height + 2;
  return (
    <div className="overflow-x-auto">
      <svg role="group" aria-label="Tree of feeds" width={width} height={height} viewBox={`0 0 ${width} ${height}`}>
        {nodes.flatMap((node) =>
          node.fed.map((child) => <Feed key={child.key} board={board} from={node} to={child} />),
        )}
        {nodes.map((node) => (
          <Box key={node.key} board={board} node={node} />
        ))}
      </svg>
    </div>
  );
}

function Feed({ board, from, to }: { board: Board; from: FeedNode; to: FeedNode }) {
  const [x0, y0] = [left(from) + size.width, top(from) + size.height / 2];
  const [x1, y1] = [left(to), top(to) + size.height / 2];
  const hasDropper = board.regulators.find(({ ref }) => ref === to.name)?.dropper;
  return (
    <g aria-hidden="true">
      <path
        d={`M${x0} ${y0}H${x0 + size.columnGap / 3}V${y1}H${x1}`}
        fill="none"
        stroke="currentColor"
        className="text-ink-soft"
      />
      {hasDropper ? (
        <rect
          x={x1 - 28}
          y={y1 - 5}
          width={20}
          height={10}
          strokeWidth={1.5}
          stroke="currentColor"
          className="fill-paper text-copper"
        />
      ) : null}
    </g>
  );
}

function Box({ board, node }: { board: Board; node: FeedNode }) {
  const words = feedWords(board, node);
  const [x, y] = [left(node), top(node)];
  const isHeld = node.rail === null || node.rail.state === 'regulates';
  return (
    <g tabIndex={0} role="img" aria-label={feedSentence(board, node)}>
      <title>{feedSentence(board, node)}</title>
      <rect
        x={x}
        y={y}
        width={size.width}
        height={size.height}
        strokeDasharray={isHeld ? undefined : '5 3'}
        strokeWidth={isHeld ? 1 : 2}
        stroke="currentColor"
        className="fill-paper text-ink-soft"
      />
      <text x={x + 10} y={y + 21} fill="currentColor" fontSize={15} fontWeight={600}>
        {shortened(node.name)}
      </text>
      <text x={x + 10} y={y + 40} fill="currentColor" fontSize={13}>
        {words[0]}
      </text>
      <text x={x + 10} y={y + 57} fill="currentColor" fontSize={13}>
        {words[1]}
      </text>
    </g>
  );
}
