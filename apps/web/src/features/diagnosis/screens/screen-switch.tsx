import { useParams, Navigate } from "react-router-dom";
import { paths } from "#lib/paths.ts";
import { AnswersScreen } from "./answers-screen.tsx";
import { CheckScreen } from "./check-screen.tsx";
import { ChecksScreen } from "./checks-screen.tsx";
import { CloseScreen } from "./close-screen.tsx";
import { ConcludeScreen } from "./conclude-screen.tsx";
import { ConfirmScreen } from "./confirm-screen.tsx";
import { DoneScreen } from "./done-screen.tsx";
import { DoorScreen } from "./door-screen.tsx";
import { LadderScreen } from "./ladder-screen.tsx";
import { LookScreen } from "./look-screen.tsx";
import { ProofScreen } from "./proof-screen.tsx";
import { PutBackScreen } from "./put-back-screen.tsx";
import { RepairScreen } from "./repair-screen.tsx";
import { SafetyScreen } from "./safety-screen.tsx";
import { StopScreen } from "./stop-screen.tsx";
import { WatchScreen } from "./watch-screen.tsx";

const SCREENS: Record<string, React.ComponentType> = {
  door: DoorScreen,
  stop: StopScreen,
  confirm: ConfirmScreen,
  look: LookScreen,
  watch: WatchScreen,
  check: CheckScreen,
  checks: ChecksScreen,
  conclude: ConcludeScreen,
  repair: RepairScreen,
  "put-back": PutBackScreen,
  proof: ProofScreen,
  answers: AnswersScreen,
  close: CloseScreen,
  done: DoneScreen,
  ladder: LadderScreen,
  safety: SafetyScreen,
};

/** The field screens by the last part of their address. They are one chunk: none may wait for a signal. */
export function ScreenSwitch() {
  const { diagnosisId = "", screen = "" } = useParams();
  const Screen = Object.hasOwn(SCREENS, screen) ? SCREENS[screen] : undefined;
  return Screen ? <Screen key={screen} /> : <Navigate to={paths.diagnosis.next(diagnosisId)} replace />;
}
