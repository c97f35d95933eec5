import { useRef, useState } from "react";

/** An act of a screen that goes to the server: whether one is under way, and why the last one failed. */
export interface Act {
  isBusy: boolean;
  problem: unknown;
  /** Does it, unless one is under way: a second tap does nothing twice. */
  run: (act: () => Promise<void>) => void;
}

/** Keeps track of the acts of one place on a screen. */
export function useAct(): Act {
  const [state, setState] = useState<{ isBusy: boolean; problem: unknown }>({ isBusy: false, problem: null });
  const busy = useRef(false);
  const run = (act: () => Promise<void>) => {
    if (busy.current) return;
    busy.current = true;
    setState({ isBusy: true, problem: null });
    const finish = (problem: unknown) => {
      busy.current = false;
      setState({ isBusy: false, problem });
    };
    act().then(() => finish(null), finish);
  };
  return { ...state, run };
}
