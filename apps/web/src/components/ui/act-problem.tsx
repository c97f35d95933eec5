import { useProblemWords } from "#lib/problem-words.ts";

/** Says why an act did not happen; nothing where it did. */
export function ActProblem({ problem }: { problem: unknown }) {
  const words = useProblemWords();
  if (problem === null || problem === undefined) return null;
  return (
    <p
      role="alert"
      className="border-l-6 border-ink bg-surface px-4 py-3 text-field font-semibold desk:text-desk"
    >
      {words(problem)}
    </p>
  );
}
