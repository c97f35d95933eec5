import { permissionsOf } from "@emberladder/contract";
import type { Me } from "@emberladder/contract";
import type { Actor } from "#http/actor.ts";
import { found } from "#http/api-error.ts";
import type { Dependencies } from "#http/dependencies.ts";
import { presentCompany } from "#modules/company/present-company.ts";
import { findCompany } from "./repository.ts";

type Session = Pick<Actor, "personId" | "companyId" | "role" | "name" | "email"> &
  Pick<Actor, "deviceId" | "twoStepPassed" | "hasTwoStep">;

/** What a client learns about its session; before the two-step code it has no permission yet. */
export async function presentMe({ database, clock }: Dependencies, session: Session): Promise<Me> {
  const company = found(await findCompany(database, session.companyId));
  const { personId, name, email, role, deviceId, twoStepPassed, hasTwoStep } = session;
  const afterCode = hasTwoStep ? "passed" : "off";
  const beforeCode = hasTwoStep ? "needed" : "set-up-needed";
  return {
    person: { id: personId, name, email, role },
    company: presentCompany(company),
    twoStep: twoStepPassed ? afterCode : beforeCode,
    permissions: twoStepPassed ? permissionsOf(role) : [],
    deviceId,
    serverTime: clock(),
  };
}
