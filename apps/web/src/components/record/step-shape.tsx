import type { Step } from "./steps-of.ts";

/** Shapes of steps: square reading, ring look, bar door or conclusion, diamond departure, lit bar call for heat. */
export function StepShape({ mark, x, y }: { mark: Step["mark"]; x: number; y: number }) {
  switch (mark) {
    case "reading":
      return (
        <rect
          x={x - 5}
          y={y - 5}
          width={10}
          height={10}
          fill="var(--surface)"
          stroke="var(--ink)"
          strokeWidth={2}
        />
      );
    case "proof":
      return <rect x={x - 5} y={y - 5} width={10} height={10} fill="var(--ink)" />;
    case "look":
      return <circle cx={x} cy={y} r={5} fill="var(--surface)" stroke="var(--ink)" strokeWidth={2} />;
    case "door":
    case "conclusion":
      return <rect x={x - 2} y={y - 8} width={4} height={16} fill="var(--ink)" />;
    case "left-tree":
      return <path d={`M${x} ${y - 7}l7 7-7 7-7-7z`} fill="var(--ink)" />;
    case "watch":
      return <rect x={x - 3} y={y - 4} width={6} height={8} fill="var(--proven)" />;
    case "stop":
      return (
        <path
          d={`M${x - 6} ${y}h4M${x + 2} ${y}h4M${x - 2} ${y - 7}v14M${x + 2} ${y - 7}v14`}
          stroke="var(--ink)"
          strokeWidth={2.5}
        />
      );
    default:
      return <circle cx={x} cy={y} r={2.5} fill="var(--quiet)" />;
  }
}
