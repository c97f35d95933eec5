import { CHAIN_ARRANGEMENTS, CHAIN_DEVICES } from "@emberladder/furnace";
import type { ChainDevice } from "@emberladder/furnace";
import { useState } from "react";
import { useController } from "react-hook-form";
import { useTranslation } from "react-i18next";
import { controlClass } from "#components/forms/field-shell.tsx";
import { useControlId } from "#components/forms/form.tsx";
import { ActButton } from "#components/ui/act.tsx";
import { chainDeviceApplies } from "../profile-fields.ts";
import { FormPart } from "./form-part.tsx";
import { useCodes } from "./use-codes.ts";

interface Chain {
  arrangement: (typeof CHAIN_ARRANGEMENTS)[number];
  order: ChainDevice[];
}

/**
 * The safety chain in the order of the unit's diagram. Devices are moved by buttons, never dragged; the words of
 * each button name the device, and what moved is said.
 */
export function ChainFields() {
  const { t } = useTranslation();
  const codes = useCodes();
  const { field } = useController({ name: "profile.chain" });
  const id = useControlId("profile.chain");
  const [said, setSaid] = useState("");
  const chain = (field.value as Chain | undefined) ?? { arrangement: "series", order: [] };
  const order = chain.order.filter((device) => chainDeviceApplies(device, codes));
  const missing = CHAIN_DEVICES.filter(
    (device) => chainDeviceApplies(device, codes) && !order.includes(device),
  );
  const name = (device: ChainDevice) => t(`trade:chainDevices.${device}`);
  const put = (next: ChainDevice[], words: string) => {
    field.onChange({ ...chain, order: next });
    setSaid(words);
  };
  const move = (index: number, by: -1 | 1) => {
    const device = order[index];
    const other = order[index + by];
    if (!device || !other) return;
    const next = order.with(index, other).with(index + by, device);
    put(next, t("desk:chain.moved", { device: name(device), place: index + by + 1, count: next.length }));
  };
  return (
    <FormPart title={t("desk:unit.chain")} note={t("desk:unit.chainAsk")}>
      <label
        htmlFor={`${id}-arrangement`}
        className="mt-3 mb-1 block text-field font-semibold desk:text-desk"
      >
        {t("desk:chain.arrangement")}
      </label>
      <select
        id={`${id}-arrangement`}
        className={controlClass}
        value={chain.arrangement}
        onChange={(event) => field.onChange({ arrangement: event.target.value, order })}
      >
        {CHAIN_ARRANGEMENTS.map((arrangement) => (
          <option key={arrangement} value={arrangement}>
            {t(`desk:arrangements.${arrangement}`)}
          </option>
        ))}
      </select>
      <ol id={id} tabIndex={-1} className="my-3 border-t border-hair">
        {order.map((device, index) => (
          <li key={device} className="flex flex-wrap items-center gap-2 border-b border-hair py-2">
            <span className="min-w-28 flex-1 text-field desk:text-desk">
              <span className="numeric mr-2">{index + 1}</span>
              {name(device)}
            </span>
            <ActButton
              disabled={index === 0}
              aria-label={t("desk:chain.upOf", { device: name(device) })}
              onClick={() => move(index, -1)}
            >
              {t("desk:chain.up")}
            </ActButton>
            <ActButton
              disabled={index === order.length - 1}
              aria-label={t("desk:chain.downOf", { device: name(device) })}
              onClick={() => move(index, 1)}
            >
              {t("desk:chain.down")}
            </ActButton>
            <ActButton
              kind="words"
              aria-label={t("desk:chain.removeOf", { device: name(device) })}
              onClick={() =>
                put(order.toSpliced(index, 1), t("desk:chain.removed", { device: name(device) }))
              }
            >
              {t("desk:chain.remove")}
            </ActButton>
          </li>
        ))}
      </ol>
      {missing.length > 0 && (
        <>
          <label htmlFor={`${id}-add`} className="mb-1 block text-field font-semibold desk:text-desk">
            {t("desk:chain.add")}
          </label>
          <select
            id={`${id}-add`}
            className={controlClass}
            value=""
            onChange={(event) => {
              const device = missing.find((one) => one === event.target.value);
              if (device) put([...order, device], t("desk:chain.added", { device: name(device) }));
            }}
          >
            <option value="">{t("desk:chain.choose")}</option>
            {missing.map((device) => (
              <option key={device} value={device}>
                {name(device)}
              </option>
            ))}
          </select>
        </>
      )}
      <p role="status" className="sr-only">
        {said}
      </p>
    </FormPart>
  );
}
