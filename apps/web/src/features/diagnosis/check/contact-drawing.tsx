import type { ContactReading } from "@emberladder/furnace";
import { useTranslation } from "react-i18next";

/** The contact between its In and Out node with the red lead walking and the black one on C. */
export function ContactDrawing({ contact }: { contact: ContactReading | undefined }) {
  const { t } = useTranslation();
  const closed = contact === "closed";
  return (
    <svg
      viewBox="0 0 296 96"
      className="block max-h-[120px] w-full"
      role="img"
      aria-label={t("inOut.drawing")}
    >
      <path
        d="M6 34h104M186 34h104"
        stroke={closed ? "var(--proven)" : "var(--ink)"}
        strokeWidth={closed ? 6 : 3}
      />
      {contact && contact !== "no-path" && <path d="M6 34h104" stroke="var(--proven)" strokeWidth={6} />}
      <path d="M130 14v40M166 14v40" stroke="var(--ink)" strokeWidth={5} />
      <path d="M110 34h20M166 34h20" stroke="var(--ink)" strokeWidth={3} />
      {closed && <rect x={132} y={16} width={32} height={36} fill="var(--proven)" />}
      <circle cx={110} cy={34} r={7} fill="var(--surface)" stroke="var(--ink)" strokeWidth={3} />
      <circle cx={186} cy={34} r={7} fill="var(--surface)" stroke="var(--ink)" strokeWidth={3} />
      <path d="M110 41v30" stroke="var(--lead-red)" strokeWidth={4} />
      <path d="M186 41v30" stroke="var(--lead-red)" strokeWidth={4} strokeDasharray="5 5" />
      <text x={110} y={90} textAnchor="middle" fontSize={16} fontWeight={600} fill="var(--lead-red)">
        {t("inOut.redIn")}
      </text>
      <text x={200} y={90} textAnchor="middle" fontSize={16} fontWeight={600} fill="var(--lead-red)">
        {t("inOut.redOut")}
      </text>
      <text x={6} y={90} fontSize={16} fontWeight={600} fill="var(--ink)">
        {t("inOut.blackC")}
      </text>
    </svg>
  );
}
