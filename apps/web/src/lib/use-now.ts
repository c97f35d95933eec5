import { useEffect, useState } from "react";

/** The clock, read again every `everyMs` while `running`. Milliseconds of the device clock. */
export function useNow(running: boolean, everyMs = 250): number {
  const [now, setNow] = useState(() => Date.now());
  useEffect(() => {
    if (!running) return undefined;
    setNow(Date.now());
    const timer = setInterval(() => setNow(Date.now()), everyMs);
    return () => clearInterval(timer);
  }, [running, everyMs]);
  return now;
}

/** Seconds as a stopwatch shows them: 0:41, 12:05. */
export function formatClock(seconds: number): string {
  const whole = Math.max(0, Math.floor(seconds));
  return `${Math.floor(whole / 60)}:${String(whole % 60).padStart(2, "0")}`;
}

/** The time at which a screen was opened, milliseconds: near enough for what depends on months. */
export function useOpenedAt(): number {
  const [openedAt] = useState(() => Date.now());
  return openedAt;
}
