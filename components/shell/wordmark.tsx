/** Our mark: three ruled lines (before, change, equilibrium) with a level settling on the last. */
export function Wordmark({ large = false }: { large?: boolean }) {
  return (
    <span className="inline-flex items-center gap-2.5 text-ink">
      <svg
        viewBox="0 0 32 32"
        aria-hidden="true"
        className={large ? 'size-11' : 'size-8'}
        fill="none"
        stroke="currentColor"
      >
        <path d="M3 7h26" strokeWidth="1.5" />
        <path d="M3 25h26" strokeWidth="1.5" />
        <path
          d="M3 12c4 0 4 8 8.5 8s4-6 8-6 4 2.5 9.5 2.5"
          strokeWidth="2.75"
          className="stroke-verdigris"
          strokeLinecap="round"
        />
      </svg>
      <span className={`font-head font-semibold tracking-tight ${large ? 'text-4xl' : 'text-2xl'}`}>
        Marlwick
      </span>
    </span>
  );
}
