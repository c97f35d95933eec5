import { loadDeskWords, startI18n } from "../../../apps/web/src/lib/i18n.ts";

let started: Promise<void> | undefined;

/** Starts the message catalogues as the client does, once a test process. */
export function startWords(): Promise<void> {
  started ??= startI18n().then(loadDeskWords);
  return started;
}
