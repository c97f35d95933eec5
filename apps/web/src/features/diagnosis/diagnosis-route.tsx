import { stepOf } from "@emberladder/diagnosis";
import type { Command, NoteText, Refusal } from "@emberladder/diagnosis";
import { useCallback, useEffect, useMemo, useState, useSyncExternalStore } from "react";
import { useMachine } from "@xstate/react";
import { Outlet, useLocation, useNavigate, useParams } from "react-router-dom";
import { useTranslation } from "react-i18next";
import { paths } from "#lib/paths.ts";
import { useMe } from "#lib/session.tsx";
import { DiagnosisContext } from "./diagnosis-context.tsx";
import type { DiagnosisWork } from "./diagnosis-context.tsx";
import { loadDiagnosis } from "./load-diagnosis.ts";
import type { LoadedDiagnosis } from "./load-diagnosis.ts";
import { MissingDiagnosis } from "./parts/missing-diagnosis.tsx";
import { givesWayToStop, pathOfNext, walkMachine } from "./walk-machine.ts";

/** Opens a diagnosis from this phone, or from the server where this phone does not have it. */
export function DiagnosisRoute() {
  const { diagnosisId = "" } = useParams();
  const me = useMe();
  const { t } = useTranslation();
  const [loaded, setLoaded] = useState<LoadedDiagnosis | "missing" | null>(null);
  useEffect(() => {
    let left = false;
    setLoaded(null);
    void loadDiagnosis(diagnosisId, me.person.id).then((result) => {
      if (!left) setLoaded(result ?? "missing");
    });
    return () => {
      left = true;
    };
  }, [diagnosisId, me.person.id]);
  if (loaded === null) return <p className="p-6 text-field">{t("field.opening")}</p>;
  if (loaded === "missing") return <MissingDiagnosis />;
  return <OpenDiagnosis key={diagnosisId} loaded={loaded} />;
}

function OpenDiagnosis({ loaded }: { loaded: LoadedDiagnosis }) {
  const { session, tree, call } = loaded;
  const { diagnosisId } = session;
  const state = useSyncExternalStore(session.subscribe, session.getState);
  const [refusal, setRefusal] = useState<Refusal | null>(null);
  const navigate = useNavigate();
  const { pathname, search } = useLocation();
  const [openedAt] = useState(() => Date.now());
  const step = stepOf(state, tree, openedAt);
  const [walk, send] = useMachine(walkMachine, { input: { step } });
  useEffect(() => send({ type: "folded", step }), [send, step]);
  const screen = pathname.split("/").at(-1) ?? "";
  const stopped = walk.matches("stopped");
  useEffect(() => {
    if (stopped && givesWayToStop(screen))
      void navigate(paths.diagnosis.stop(diagnosisId), { replace: true });
  }, [stopped, screen, navigate, diagnosisId]);

  const record = useCallback(
    async (commands: readonly Command[], notes?: readonly NoteText[]) => {
      const result = await session.record(commands, notes);
      setRefusal(result.ok ? null : result.refusal);
      return result.ok ? result.state : null;
    },
    [session],
  );
  const recordAndGoOn = useCallback(
    async (commands: readonly Command[], notes?: readonly NoteText[]) => {
      const next = await record(commands, notes);
      if (!next) return;
      const to = pathOfNext(diagnosisId, next, tree);
      // A page that stays, as the door does between its questions, is one step back and not three. An act of the
      // tree is no question: once done there is nothing to come back to.
      const isDoStep = pathname === paths.diagnosis.check(diagnosisId) && search === "";
      await navigate(to, { replace: isDoStep || to === pathname + search });
    },
    [record, navigate, diagnosisId, tree, pathname, search],
  );
  const { profile } = state;
  const work = useMemo<DiagnosisWork | null>(
    () =>
      profile && {
        diagnosisId,
        state,
        profile,
        tree,
        call,
        record,
        recordAndGoOn,
        refusal,
        clearRefusal: () => setRefusal(null),
      },
    [diagnosisId, state, profile, tree, call, record, recordAndGoOn, refusal],
  );
  if (!work) return <MissingDiagnosis />;
  return (
    <DiagnosisContext value={work}>
      <Outlet />
    </DiagnosisContext>
  );
}
