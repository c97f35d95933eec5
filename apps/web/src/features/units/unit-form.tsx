import type { UnitProfile } from "@emberladder/furnace";
import { useMemo } from "react";
import { useTranslation } from "react-i18next";
import { Form } from "#components/forms/form.tsx";
import { TextField } from "#components/forms/text-field.tsx";
import { BandsFields } from "./form/bands-fields.tsx";
import { ChainFields } from "./form/chain-fields.tsx";
import { CodeFields } from "./form/code-fields.tsx";
import { OptionFields } from "./form/option-fields.tsx";
import { PlateFields } from "./form/plate-fields.tsx";
import { unitFormSchema } from "./unit-form-schema.ts";

/** A unit as it is described on site: its kind first, then only what that kind can have. */
export interface UnitDraft {
  name: string;
  profile: UnitProfile;
}

/**
 * Form of a new unit and of a correction. Nothing but the name and the six codes has to be known; a blank stays
 * unknown, and is never taken for a no.
 */
export function UnitForm({
  draft,
  submitLabel,
  onSubmit,
}: {
  draft: UnitDraft;
  submitLabel: string;
  onSubmit: (unit: UnitDraft) => Promise<void>;
}) {
  const { t } = useTranslation();
  const schema = useMemo(
    () => unitFormSchema((reason) => t([`trade:variantProblems.${reason}`, "desk:form.cannotUse"])),
    [t],
  );
  return (
    <div className="max-w-180 px-4 py-5 desk:px-6">
      <Form schema={schema} defaults={draft} submitLabel={submitLabel} onSubmit={onSubmit}>
        <TextField name="name" label={t("desk:unit.name")} hint={t("desk:unit.nameHint")} />
        <CodeFields />
        <PlateFields />
        <ChainFields />
        <OptionFields />
        <BandsFields />
      </Form>
    </div>
  );
}
