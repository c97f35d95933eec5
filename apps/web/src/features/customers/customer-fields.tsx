import { useTranslation } from "react-i18next";
import { TextField } from "#components/forms/text-field.tsx";

/** Who a customer is and how to reach them. The report goes to the e-mail. */
export function CustomerFields() {
  const { t } = useTranslation();
  return (
    <>
      <TextField
        name="firstName"
        label={t("desk:customer.firstName")}
        hint={t("desk:customer.firstNameHint")}
      />
      <TextField name="lastName" label={t("desk:customer.lastName")} empty="null" />
      <TextField
        name="email"
        type="email"
        label={t("desk:customer.email")}
        hint={t("desk:customer.emailHint")}
        inputMode="email"
        empty="null"
      />
      <TextField name="phone" type="tel" label={t("desk:customer.phone")} inputMode="tel" empty="null" />
    </>
  );
}
