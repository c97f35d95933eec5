import type { CallDetail } from "@emberladder/contract";
import type { Command, DiagnosisState, NoteText, Refusal } from "@emberladder/diagnosis";
import type { UnitProfile } from "@emberladder/furnace";
import type { TreeDocument } from "@emberladder/trees";
import { createContext, useContext } from "react";

/** What every field screen works with. */
export interface DiagnosisWork {
  diagnosisId: string;
  state: DiagnosisState;
  profile: UnitProfile;
  tree: TreeDocument | null;
  call: CallDetail | null;
  /** Records commands durably; on a refusal nothing is kept and the words are shown. */
  record: (commands: readonly Command[], notes?: readonly NoteText[]) => Promise<DiagnosisState | null>;
  /** Records and then opens the screen of the next step. */
  recordAndGoOn: (commands: readonly Command[], notes?: readonly NoteText[]) => Promise<void>;
  refusal: Refusal | null;
  clearRefusal: () => void;
}

export const DiagnosisContext = createContext<DiagnosisWork | null>(null);

/** The diagnosis on screen; only below `DiagnosisRoute`. */
export function useDiagnosis(): DiagnosisWork {
  const work = useContext(DiagnosisContext);
  if (!work) throw new Error("useDiagnosis is used outside of a diagnosis.");
  return work;
}
