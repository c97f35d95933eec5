import { useCallback } from "react";
import { useTranslation } from "react-i18next";
import { ApiProblem } from "./api-client.ts";

/**
 * Says what went wrong in words for people: our own words where the screens know better than the server what
 * to do next, else what the server said.
 */
export function useProblemWords(): (problem: unknown) => string {
  const { t, i18n } = useTranslation();
  return useCallback(
    (problem: unknown) => {
      if (!(problem instanceof ApiProblem)) return t("desk:problems.unknown");
      const key = `desk:problems.${problem.code}`;
      if (i18n.exists(key)) return t(key);
      return [problem.message, problem.detail].filter(Boolean).join(" ");
    },
    [t, i18n],
  );
}
