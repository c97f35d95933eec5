import { stateForCheck } from "@emberladder/diagnosis";
import type { CheckId } from "@emberladder/furnace";
import type { AskingNode } from "@emberladder/trees";
import { useTranslation } from "react-i18next";
import { useDiagnosis } from "../diagnosis-context.tsx";

/** State of the unit in which the reading is taken: a reading without its state is not evidence. */
export function UnitStateBar({ check, node }: { check: CheckId; node: AskingNode | undefined }) {
  const { t } = useTranslation();
  const { state } = useDiagnosis();
  const unit = { ...state.unit, ...stateForCheck(check, state.current?.way ?? node?.way) };
  const cells = [
    t(unit.power === "on" ? "unitState.powerOn" : "unitState.powerOff"),
    t(unit.calling ? "unitState.calling" : "unitState.notCalling"),
    t(unit.gas === "open" ? "unitState.gasOpen" : "unitState.gasShut"),
  ];
  return (
    <ul className="short:group-has-[input:not(:placeholder-shown)]:hidden grid grid-cols-3 divide-x-2 divide-hair rounded large-letters:grid-cols-1 large-letters:divide-x-0 border-2 border-hair bg-surface text-center text-label font-semibold">
      {cells.map((cell) => (
        <li key={cell} className="px-1 py-1.5">
          {cell}
        </li>
      ))}
    </ul>
  );
}
