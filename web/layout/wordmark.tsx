/** The name with a small ladder of rises up to a dashed limit. */
export function Wordmark({ large = false }: { large?: boolean }) {
  return (
    <span className={`inline-flex items-center gap-2.5 font-semibold tracking-tight ${large ? 'text-3xl' : 'text-lg'}`}>
      <svg aria-hidden="true" viewBox="0 0 16 20" className={large ? 'h-10 w-8' : 'h-6 w-5'}>
        <path d="M1 19h14" stroke="currentColor" strokeWidth="1.2" />
        <path d="M3.5 15.8h9" stroke="var(--copper)" strokeWidth="2.8" opacity="0.55" />
        <path d="M3.5 11.6h9" stroke="var(--copper)" strokeWidth="2.8" opacity="0.8" />
        <path d="M3.5 7.4h9" stroke="var(--copper)" strokeWidth="2.8" />
        <path d="M1 2.4h14" stroke="currentColor" strokeWidth="1.2" strokeDasharray="2.2 1.4" />
      </svg>
      Dropwatt
    </span>
  );
}
