import { createUnit } from "@emberladder/contract";
import { CHECK_IDS, parseChain, profileProblems, unitProfileSchema } from "@emberladder/furnace";
import { z } from "zod";
import { pruneProfile } from "./prune-profile.ts";

const CHECKS = new Set<string>(CHECK_IDS);

/**
 * What the form of a unit sends: its name and a profile that a real unit can have. `words` turns a reason code
 * into a message; each message stands at the field it is about.
 */
export function unitFormSchema(words: (reason: string) => string) {
  return z
    .strictObject({ name: createUnit.body.shape.name, profile: unitProfileSchema })
    .transform(({ name, profile }) => ({ name, profile: pruneProfile(profile) }))
    .superRefine(({ profile }, context) => {
      for (const { field, reason } of profileProblems(profile)) {
        context.addIssue({ code: "custom", path: ["profile", ...field.split(".")], message: words(reason) });
      }
      profile.bands.forEach((band, index) => {
        const parsed = parseChain(band.chain);
        if (!parsed.ok) {
          context.addIssue({
            code: "custom",
            path: ["profile", "bands", index, "chain"],
            message: parsed.message,
          });
        }
        if (!CHECKS.has(band.check)) {
          context.addIssue({
            code: "custom",
            path: ["profile", "bands", index, "check"],
            message: words("unknown-check"),
          });
        }
      });
    });
}
