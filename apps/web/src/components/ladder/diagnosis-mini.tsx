import { fold, ladderOf } from "@emberladder/diagnosis";
import type { Rung } from "@emberladder/diagnosis";
import { useEffect, useState } from "react";
import type { ReactNode } from "react";
import { localStore } from "#lib/store/database.ts";
import { byPlace } from "#lib/store/diagnosis-session.ts";
import { LadderMini } from "./ladder-mini.tsx";

/** The ladder of a diagnosis as this phone's own record has it; the cold one where the phone has none. */
export function DiagnosisMini({ diagnosisId, cold }: { diagnosisId: string; cold: ReactNode }) {
  const [rungs, setRungs] = useState<Rung[]>([]);
  useEffect(() => {
    let left = false;
    void localStore.events
      .where("diagnosisId")
      .equals(diagnosisId)
      .toArray()
      .then((events) => !left && setRungs(ladderOf(fold(events.toSorted(byPlace)))));
    return () => {
      left = true;
    };
  }, [diagnosisId]);
  return rungs.length > 0 ? <LadderMini rungs={rungs} /> : cold;
}
