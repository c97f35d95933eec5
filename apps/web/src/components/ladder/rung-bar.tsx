import type { Rung } from "@emberladder/diagnosis";

/**
 * One rung drawn between two rails, in a box of its own coordinates: `left` and `right` are the rails' x,
 * `y` the height of the bar. Every state is told by shape; colour comes third. Bars: waiting thin; climbing
 * lit to a round tip, dotted beyond; passed thin with a hollow ring; read open thin ink with open plates;
 * proven solid, over both rails; stopped heavy and broken at the contact; bypassed hatched with dotted ends.
 */
export function RungBar({ rung, left, right, y }: { rung: Rung; left: number; right: number; y: number }) {
  const middle = (left + right) / 2;
  const reach = 5;
  switch (rung.state) {
    case "waiting":
      return <line x1={left} x2={right} y1={y} y2={y} stroke="var(--rule)" strokeWidth={1.5} />;
    case "climbing":
      return (
        <g>
          <line
            x1={middle}
            x2={right}
            y1={y}
            y2={y}
            stroke="var(--rule)"
            strokeWidth={1.5}
            strokeDasharray="2 3"
          />
          <line x1={left} x2={middle} y1={y} y2={y} stroke="var(--proven)" strokeWidth={4} />
          <circle cx={middle} cy={y} r={4.5} fill="var(--proven)" />
        </g>
      );
    case "passed":
      return (
        <g>
          <line x1={left} x2={right} y1={y} y2={y} stroke="var(--proven)" strokeWidth={2.4} />
          <circle cx={middle} cy={y} r={4} fill="var(--ground)" stroke="var(--proven)" strokeWidth={2.4} />
        </g>
      );
    case "read-open":
      return (
        <g stroke="var(--ink)">
          <line x1={left} x2={middle - 4} y1={y} y2={y} strokeWidth={2.2} />
          <line x1={middle + 4} x2={right} y1={y} y2={y} strokeWidth={2.2} />
          <line x1={middle - 4} x2={middle - 4} y1={y - 6} y2={y + 6} strokeWidth={2.5} />
          <line x1={middle + 4} x2={middle + 4} y1={y - 6} y2={y + 6} strokeWidth={2.5} />
        </g>
      );
    case "proven":
      return (
        <g>
          <line x1={left - reach} x2={right + reach} y1={y} y2={y} stroke="var(--glow)" strokeWidth={14} />
          <line
            className="rung-lit"
            x1={left - reach}
            x2={right + reach}
            y1={y}
            y2={y}
            stroke="var(--proven)"
            strokeWidth="var(--lit)"
          />
        </g>
      );
    case "stopped":
      return (
        <g>
          <line
            x1={left - reach}
            x2={middle - 9}
            y1={y}
            y2={y}
            stroke={rung.litToGap ? "var(--proven)" : "var(--stopped)"}
            strokeWidth={rung.litToGap ? 6 : 3.5}
          />
          <line x1={middle + 9} x2={right + reach} y1={y} y2={y} stroke="var(--stopped)" strokeWidth={3.5} />
          <line
            x1={middle - 9}
            x2={middle - 9}
            y1={y - 9}
            y2={y + 9}
            stroke="var(--stopped)"
            strokeWidth={3.5}
          />
          <line
            x1={middle + 9}
            x2={middle + 9}
            y1={y - 9}
            y2={y + 9}
            stroke="var(--stopped)"
            strokeWidth={3.5}
          />
        </g>
      );
    case "bypassed":
      return (
        <g>
          <line
            x1={left}
            x2={right}
            y1={y}
            y2={y}
            stroke="var(--bypassed)"
            strokeWidth={7}
            strokeDasharray="3 3"
          />
          <circle cx={left} cy={y} r={4} fill="var(--bypassed)" />
          <circle cx={right} cy={y} r={4} fill="var(--bypassed)" />
        </g>
      );
  }
}
