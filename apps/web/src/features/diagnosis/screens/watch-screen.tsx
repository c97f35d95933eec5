import { lastWatch } from "@emberladder/diagnosis";
import { useDiagnosis } from "../diagnosis-context.tsx";
import { AfterNoGlow } from "../watch/after-no-glow.tsx";
import { BeforeWatch } from "../watch/before-watch.tsx";
import { RunningWatch } from "../watch/running-watch.tsx";

/** One call for heat: the question before it, the watch itself, and the act that must follow a missing glow. */
export function WatchScreen() {
  const { state } = useDiagnosis();
  const watch = lastWatch(state);
  if (watch && !watch.ended) return <RunningWatch watch={watch} />;
  if (watch?.ended?.how === "no-glow" && state.unit.gas === "open") return <AfterNoGlow />;
  return <BeforeWatch />;
}
