import type { ProofItem } from "@emberladder/diagnosis";
import { useTranslation } from "react-i18next";
import { OutcomeMark } from "#components/ui/outcome-mark.tsx";
import { natureOf, useReadingUnits } from "#lib/use-reading-units.ts";
import { ProofAct } from "./proof-act.tsx";

/** One closing check: what is wanted in words, the act that records it, and the value once it is read. `stays` keeps the page. */
export function ProofRow({ item, stays = false }: { item: ProofItem; stays?: boolean }) {
  const { t } = useTranslation();
  const { write } = useReadingUnits();
  const { reading, verdict } = item;
  const wanted = t(`trade:closing.${item.id}.right`);
  const value =
    reading?.value !== undefined && reading.unit
      ? write(reading.value, reading.unit, natureOf(item.id))
      : reading?.seenRight
        ? t("proof.seen")
        : "";
  return (
    <div className="flex flex-col gap-2 py-1">
      <p className="flex items-start gap-3 text-field">
        <span className="pt-0.5">
          {reading ? <OutcomeMark outcome={verdict.pass ? "good" : "fail"} /> : <OpenMark />}
        </span>
        <span className="grow">
          <span className="font-semibold">{t(`trade:closing.${item.id}.title`)}</span>
          {!verdict.pass && <span className="block text-quiet">{wanted}</span>}
          {verdict.notice && (
            <span className="block font-semibold">{t(`trade:closingNotices.${verdict.notice}`)}</span>
          )}
        </span>
        <span className="numeric shrink-0 font-semibold">{value}</span>
      </p>
      {!verdict.pass && <ProofAct item={item} stays={stays} />}
    </div>
  );
}

function OpenMark() {
  return (
    <svg viewBox="0 0 26 20" width={26} height={20} aria-hidden="true">
      <circle cx={13} cy={10} r={8} fill="none" stroke="var(--rule)" strokeWidth={2} />
    </svg>
  );
}
