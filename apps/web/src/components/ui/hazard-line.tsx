/** A safety line: at most twelve words, above the instruction, never dismissed. */
export function HazardLine({ children, flush }: { children: string; flush?: boolean }) {
  return (
    <p
      className={`flex items-center gap-3 border-2 border-caution-edge bg-caution px-3 py-2.5 text-field font-semibold text-balance text-on-caution ${flush ? "" : "rounded"}`}
    >
      <svg viewBox="0 0 28 26" width={28} height={26} className="shrink-0" aria-hidden="true">
        <path
          d="M14 2.5 26 23.5H2z"
          fill="none"
          stroke="currentColor"
          strokeWidth={2.5}
          strokeLinejoin="round"
        />
        <path d="M14 10v6.5M14 19v2.2" stroke="currentColor" strokeWidth={2.6} />
      </svg>
      <span>{children}</span>
    </p>
  );
}
