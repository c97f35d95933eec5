import { useCallback } from "react";
import { useTranslation } from "react-i18next";

interface Issue {
  code?: string;
  input?: unknown;
  expected?: unknown;
  minimum?: unknown;
  maximum?: unknown;
  origin?: unknown;
}

/**
 * Words for what a schema refuses and has no words of its own for. A message that a field of the contract gives
 * stays as it is.
 */
export function useIssueWords(): (issue: Issue) => string {
  const { t } = useTranslation();
  return useCallback(
    (issue: Issue) => {
      const isEmpty = issue.input === undefined || issue.input === null || issue.input === "";
      if (issue.code === "invalid_type") return t(isEmpty ? "desk:form.fillIn" : "desk:form.number");
      if (issue.code === "too_small") {
        // Above zero is said by example: "at least 0" would be wrong.
        return issue.minimum === 0
          ? t("desk:form.aboveZero")
          : t("desk:form.atLeast", { limit: issue.minimum });
      }
      if (issue.code === "too_big") return t("desk:form.atMost", { limit: issue.maximum });
      if (issue.code === "invalid_value" || issue.code === "invalid_union") return t("desk:form.choose");
      return t("desk:form.cannotUse");
    },
    [t],
  );
}
