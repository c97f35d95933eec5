/** Says what an act did, politely, without moving the focus; it stays until the next act. */
export function StatusNote({ words }: { words: string | null }) {
  return (
    <p
      role="status"
      className={
        words ? "border-l-6 border-ink bg-surface px-4 py-3 text-field font-medium desk:text-desk" : "sr-only"
      }
    >
      {words}
    </p>
  );
}
