import i18next from "i18next";
import { initReactI18next } from "react-i18next";
import { shell } from "#messages/en/shell.ts";
import { ui } from "#messages/en/ui.ts";

/**
 * The words of the first screens. The desk's other words are added by `loadDeskWords`, those of the field flow
 * and the trade by `loadTradeWords`, so that sign-in does not wait for them.
 */
export async function startI18n(): Promise<void> {
  await i18next.use(initReactI18next).init({
    lng: "en",
    fallbackLng: "en",
    ns: ["ui", "desk"],
    defaultNS: "ui",
    resources: { en: { ui, desk: shell } },
    interpolation: { escapeValue: false },
    returnNull: false,
  });
}

let deskWords: Promise<void> | undefined;

/** Adds the words of all screens outside of a diagnosis, once. */
export function loadDeskWords(): Promise<void> {
  deskWords ??= import("#messages/en/desk.ts").then(({ desk }) => {
    i18next.addResourceBundle("en", "desk", desk, true, true);
  });
  // Without a signal it fails, and is asked for again.
  deskWords.catch(() => (deskWords = undefined));
  return deskWords;
}

let tradeWords: Promise<void> | undefined;

/** Adds the words of the field flow and of the trade, once; resolves when `t("trade:…")` answers. */
export function loadTradeWords(): Promise<void> {
  tradeWords ??= Promise.all([import("@emberladder/words"), import("#messages/en/field-flow.ts")]).then(
    ([{ en }, { fieldFlow }]) => {
      i18next.addResourceBundle("en", "trade", en, true, true);
      i18next.addResourceBundle("en", "ui", fieldFlow, true, true);
    },
  );
  tradeWords.catch(() => (tradeWords = undefined));
  return tradeWords;
}
