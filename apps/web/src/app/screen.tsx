import type { ComponentType } from "react";
import { loadDeskWords, loadTradeWords } from "#lib/i18n.ts";
import { LateScreen } from "./late-screen.tsx";

/**
 * Loads a screen with its words: the desk's, where it is not one of the first, and the trade's, where it shows any.
 * Where there is no signal for what was never fetched, a screen stands in that says so and can try again: the
 * router itself asks once only.
 */
export function screen<M>(
  load: () => Promise<M>,
  pick: (module: M) => ComponentType,
  options: { trade?: boolean; first?: boolean } = {},
): () => Promise<{ Component: ComponentType }> {
  const fetchScreen = async () => {
    const [module] = await Promise.all([
      load(),
      options.first ? undefined : loadDeskWords(),
      options.trade ? loadTradeWords() : undefined,
    ]);
    return pick(module);
  };
  return async () => {
    try {
      return { Component: await fetchScreen() };
    } catch (problem) {
      if (!isNotFetched(problem)) throw problem;
      return { Component: () => <LateScreen fetchScreen={fetchScreen} /> };
    }
  };
}

/**
 * Whether a part of the client did not come, in the words of Chromium and Firefox ("dynamically imported module"),
 * Safari ("Importing a module script failed") and of the bundler for a style sheet ("preload").
 */
export function isNotFetched(problem: unknown): boolean {
  return (
    problem instanceof Error && /dynamically imported module|module script|preload/i.test(problem.message)
  );
}
