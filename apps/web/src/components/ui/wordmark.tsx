/**
 * The product's name with its mark: four rungs of a ladder, two of them lit. Where room is short on a phone, only
 * the mark is drawn and the name is still spoken.
 */
export function Wordmark({ isShortOnPhone = false }: { isShortOnPhone?: boolean }) {
  return (
    <span className="flex items-center gap-2 py-2 text-field font-bold">
      <svg viewBox="0 0 20 26" width={20} height={26} aria-hidden="true">
        <path d="M4 1v24M16 1v24" stroke="var(--ink)" strokeWidth={2.4} />
        <path d="M4 5h12M4 11h12" stroke="var(--rule)" strokeWidth={1.6} />
        <path d="M1 17h18M1 22h18" stroke="var(--proven)" strokeWidth={3.2} />
      </svg>
      {/* The name is the same in every language. */}
      <span translate="no" className={isShortOnPhone ? "sr-only desk:not-sr-only" : undefined}>
        {PRODUCT}
      </span>
    </span>
  );
}

const PRODUCT = "Emberladder";
