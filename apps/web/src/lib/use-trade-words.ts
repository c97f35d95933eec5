import { useEffect, useState } from "react";
import { loadTradeWords } from "./i18n.ts";

/**
 * Loads the trade's words behind a screen that can be read without them. True once `t("trade:…")` answers;
 * the screen is drawn again then.
 */
export function useTradeWords(): boolean {
  const [loaded, setLoaded] = useState(false);
  useEffect(() => {
    let left = false;
    void loadTradeWords().then(
      () => !left && setLoaded(true),
      () => undefined,
    );
    return () => {
      left = true;
    };
  }, []);
  return loaded;
}
