import type { DoorAnswer, Look } from "@emberladder/diagnosis";
import { useTranslation } from "react-i18next";

/**
 * One look: the wide half says it is right, the narrow half is a hit. Answered, the half that was tapped is
 * inverted and says what was found.
 */
export function LookRow({
  item,
  look,
  atUnit,
  onRight,
  onHit,
}: {
  item: string;
  look?: Look;
  atUnit?: DoorAnswer;
  onRight: () => void;
  onHit: () => void;
}) {
  const { t } = useTranslation();
  const right = look?.answer === "right" || (atUnit?.question === "at-unit" && atUnit.found.length === 0);
  const hit =
    (look !== undefined && look.answer !== "right") ||
    (atUnit?.question === "at-unit" && atUnit.found.length > 0);
  const foundWord =
    look?.check && look.finding ? t(`trade:findings.${look.check}.${look.finding}`) : undefined;
  return (
    <li className="grid grid-cols-[1fr_6.5rem] large-letters:grid-cols-1 gap-2">
      <button
        type="button"
        aria-pressed={right}
        onClick={onRight}
        className={`min-h-14 rounded px-3 py-1.5 text-left text-field ${right ? "border-4 border-ink bg-surface" : "border-2 border-rule bg-surface"}`}
      >
        <span className="block font-semibold">{t([`trade:firstLook.${item}.title`, "look.atUnitName"])}</span>
        <span className="block leading-5.5 text-quiet short:hidden">
          {foundWord ?? t([`trade:firstLook.${item}.right`, "look.atUnitRight"])}
        </span>
      </button>
      <button
        type="button"
        aria-pressed={hit}
        onClick={onHit}
        className={`min-h-14 rounded text-field font-semibold ${hit ? "border-4 border-ink bg-stopped text-on-stopped" : "border-2 border-rule bg-ground"}`}
      >
        {t(item === "status-light" ? "look.note" : "look.hit")}
        <span className="sr-only">{` ${t([`trade:firstLook.${item}.title`, "look.atUnitName"])}`}</span>
      </button>
    </li>
  );
}
