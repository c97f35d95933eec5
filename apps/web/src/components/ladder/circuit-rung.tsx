import { useTranslation } from "react-i18next";
import type { CircuitRung, LoadMark } from "./circuits.ts";
import { useRungFigures } from "./use-rung-figures.ts";

/** One rung of the full ladder: number, contacts with their names above them, the load, and what was read. */
export function CircuitRungDrawing({
  row,
  y,
  left,
  right,
  isStopped,
}: {
  row: CircuitRung;
  y: number;
  left: number;
  right: number;
  isStopped: boolean;
}) {
  const { t } = useTranslation();
  const figuresOf = useRungFigures();
  const { rung, contacts, load } = row;
  const lit = rung.state === "proven" || rung.state === "passed";
  const quiet = rung.state === "waiting";
  const loadX = right - 24;
  const from = left + 56;
  const gap = (loadX - 40 - from) / Math.max(contacts.length, 1);
  const placed = contacts.map((contact, index) => ({ ...contact, x: from + gap * index + gap / 2 - 10 }));
  const open = placed.at(-1)?.x ?? from;
  return (
    <g fill="var(--ink)" fontSize={16}>
      <text
        x={left + 8}
        y={y - 12}
        className="numeric"
        fontWeight={600}
        fill={quiet ? "var(--quiet)" : "var(--ink)"}
      >
        {rung.number}
      </text>
      {rung.state === "proven" && (
        <path d={`M${left - 6} ${y}H${right + 6}`} stroke="var(--glow)" strokeWidth={14} />
      )}
      {isStopped ? (
        <>
          <path
            d={`M${left - 6} ${y}H${open - 12}`}
            stroke={rung.litToGap ? "var(--proven)" : "var(--stopped)"}
            strokeWidth={rung.litToGap ? 6 : 3.5}
          />
          <path d={`M${open + 12} ${y}H${right + 6}`} stroke="var(--stopped)" strokeWidth={3.5} />
        </>
      ) : (
        <path
          d={`M${lit && rung.state === "proven" ? left - 6 : left} ${y}H${lit && rung.state === "proven" ? right + 6 : right}`}
          stroke={lit ? "var(--proven)" : quiet ? "var(--rule)" : "var(--ink)"}
          strokeWidth={rung.state === "proven" ? "var(--lit)" : quiet ? 1.5 : 2.4}
        />
      )}
      {placed.map((contact, index) => (
        <Contact
          key={index}
          x={contact.x}
          y={y}
          closed={lit && rung.stage !== "draft-rest"}
          normallyClosed={contact.normallyClosed}
          wide={isStopped && index === placed.length - 1}
          quiet={quiet}
        />
      ))}
      {placed.map((contact, index) => (
        <text
          key={index}
          x={contact.x}
          y={y - 15}
          textAnchor="middle"
          fill={quiet ? "var(--quiet)" : "var(--ink)"}
        >
          {t(`ladder.devices.${contact.name}`)}
        </text>
      ))}
      <text x={right - 4} y={y - 15} textAnchor="end" fill={quiet ? "var(--quiet)" : "var(--ink)"}>
        {t(`ladder.devices.${load.name}`)}
      </text>
      <Load mark={load.mark} x={loadX} y={y} energised={rung.state === "proven"} quiet={quiet} />
      {rung.state === "passed" && (
        <circle cx={left + 36} cy={y} r={5} fill="var(--ground)" stroke="var(--proven)" strokeWidth={2.4} />
      )}
      {rung.reading && (
        <text x={open} y={y + 24} textAnchor="middle" className="numeric" fontWeight={600}>
          {figuresOf(rung)}
        </text>
      )}
      {isStopped && (
        <g>
          <rect x={left + 16} y={y + 32} width={88} height={30} rx={4} fill="var(--stopped)" />
          <text
            x={left + 60}
            y={y + 53}
            textAnchor="middle"
            fontSize={18}
            fontWeight={600}
            fill="var(--on-stopped)"
          >
            {t("ladder.stoppedLabel")}
          </text>
        </g>
      )}
    </g>
  );
}

function Contact({
  x,
  y,
  closed,
  normallyClosed,
  wide,
  quiet,
}: {
  x: number;
  y: number;
  closed: boolean;
  normallyClosed: boolean;
  wide: boolean;
  quiet: boolean;
}) {
  const half = wide ? 12 : 7;
  const plate = wide ? 20 : 11;
  const stroke = quiet ? "var(--rule)" : "var(--ink)";
  return (
    <g>
      {!closed && !wide && <rect x={x - half} y={y - 4} width={half * 2} height={8} fill="var(--ground)" />}
      {closed && (
        <rect x={x - half} y={y - plate + 2} width={half * 2} height={plate * 2 - 4} fill="var(--proven)" />
      )}
      <path
        d={`M${x - half} ${y - plate}v${plate * 2}M${x + half} ${y - plate}v${plate * 2}`}
        stroke={stroke}
        strokeWidth={wide ? 4 : 2.8}
      />
      {normallyClosed && (
        <path
          d={`M${x - half - 3} ${y + plate}L${x + half + 3} ${y - plate}`}
          stroke={stroke}
          strokeWidth={2.2}
        />
      )}
    </g>
  );
}

function Load({
  mark,
  x,
  y,
  energised,
  quiet,
}: {
  mark: LoadMark;
  x: number;
  y: number;
  energised: boolean;
  quiet: boolean;
}) {
  const stroke = quiet ? "var(--rule)" : "var(--ink)";
  const fill = energised ? "var(--glow)" : "var(--ground)";
  if (mark === "heater" || mark === "valve") {
    return (
      <g stroke={stroke} strokeWidth={2.2} fill={fill}>
        <rect x={x - 18} y={y - 10} width={36} height={20} />
        {mark === "heater" ? (
          <path d={`M${x - 9} ${y - 10}v20M${x} ${y - 10}v20M${x + 9} ${y - 10}v20`} />
        ) : (
          <path d={`M${x - 18} ${y + 10}L${x + 18} ${y - 10}`} />
        )}
      </g>
    );
  }
  return (
    <g stroke={stroke} strokeWidth={2.2} fill={fill}>
      {mark === "rings" ? (
        <>
          <circle cx={x - 6} cy={y} r={10} />
          <circle cx={x + 6} cy={y} r={10} fill="none" />
        </>
      ) : (
        <circle cx={x} cy={y} r={12} />
      )}
      {mark === "motor" && (
        <text
          x={x}
          y={y + 5}
          textAnchor="middle"
          fontSize={14}
          fontWeight={600}
          stroke="none"
          fill="var(--ink)"
        >
          {"M"}
        </text>
      )}
    </g>
  );
}
