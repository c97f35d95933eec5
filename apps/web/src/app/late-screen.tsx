import { useEffect, useState } from "react";
import type { ComponentType } from "react";
import { useTranslation } from "react-i18next";
import { FailedNote } from "./failed-screen.tsx";

/**
 * Stands in for a screen that was never fetched and cannot be now. It tries again by itself when the device finds
 * a signal, and by one act; a browser that remembers the failure gets a fresh start, but only once the server
 * answers, because without a signal that would lose the page.
 */
export function LateScreen({ fetchScreen }: { fetchScreen: () => Promise<ComponentType> }) {
  const { t } = useTranslation();
  const [loaded, setLoaded] = useState<{ Screen: ComponentType } | null>(null);
  useEffect(() => {
    let left = false;
    const tryQuietly = () =>
      void fetchScreen().then(
        (Screen) => !left && setLoaded({ Screen }),
        () => undefined,
      );
    addEventListener("online", tryQuietly);
    return () => {
      left = true;
      removeEventListener("online", tryQuietly);
    };
  }, [fetchScreen]);
  if (loaded) return <loaded.Screen />;
  const tryAgain = async () => {
    try {
      setLoaded({ Screen: await fetchScreen() });
    } catch {
      if (await canReachServer()) location.reload();
    }
  };
  return (
    <FailedNote title={t("failed.neverOpened")} act={t("failed.tryAgain")} onAct={() => void tryAgain()} />
  );
}

async function canReachServer(): Promise<boolean> {
  return fetch("/health/ready", { cache: "no-store" }).then(
    (answer) => answer.ok,
    () => false,
  );
}
