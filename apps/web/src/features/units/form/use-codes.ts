import type { VariantCodes } from "@emberladder/furnace";
import { useWatch } from "react-hook-form";

/** The six codes as they are chosen now; the rest of the form follows them. */
export function useCodes(): VariantCodes {
  return useWatch({ name: "profile.codes" }) as VariantCodes;
}
