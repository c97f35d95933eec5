import i18next from "i18next";
import { initReactI18next } from "react-i18next";
import { desk } from "#messages/en/desk.ts";
import { ui } from "#messages/en/ui.ts";

/**
 * The screens' own words. Trade words (checks, faults, rungs) are added by `loadTradeWords` when the field
 * flow or the desk first needs them, so that sign-in does not wait for them.
 */
export async function startI18n(): Promise<void> {
  await i18next.use(initReactI18next).init({
    lng: "en",
    fallbackLng: "en",
    ns: ["ui", "desk"],
    defaultNS: "ui",
    resources: { en: { ui, desk } },
    interpolation: { escapeValue: false },
    returnNull: false,
  });
}

let loaded: Promise<void> | undefined;

/** Adds the trade words, once; resolves when `t("trade:…")` answers. */
export function loadTradeWords(): Promise<void> {
  loaded ??= import("@emberladder/words").then(({ en }) => {
    i18next.addResourceBundle("en", "trade", en, true, true);
  });
  return loaded;
}
