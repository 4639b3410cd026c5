/** Look of a tab, shared by tabs and by rows of links that look alike. */
export const tabClass =
  '-mb-px inline-flex min-h-10 items-center gap-2 border-b-2 border-transparent px-1 font-semibold whitespace-nowrap text-ink-soft hover:text-ink data-[state=active]:border-copper data-[state=active]:text-ink aria-[current=page]:border-copper aria-[current=page]:text-ink';
