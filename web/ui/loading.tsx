/** Shown while something is on its way; appears late, so that a quick answer does not flicker. */
export function Loading({ what }: { what: string }) {
  return (
    <p role="status" className="late flex items-center gap-3 py-6 text-ink-soft">
      <span aria-hidden="true" className="inline-flex flex-col gap-0.5">
        <span className="h-1 w-5 bg-copper motion-safe:animate-pulse" />
        <span className="h-1 w-5 bg-line-strong" />
        <span className="h-1 w-5 bg-line" />
      </span>
      Loading {what} …
    </p>
  );
}
