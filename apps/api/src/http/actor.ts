import { can } from "@emberladder/contract";
import type { Permission, Role } from "@emberladder/contract";
import { ApiError } from "./api-error.ts";

/** The signed-in person behind a request. The company comes from here and never from the request. */
export interface Actor {
  personId: string;
  companyId: string;
  role: Role;
  name: string;
  email: string;
  /** Hash of the session's secret: the session's key, and what logs may show the start of. */
  sessionHash: string;
  deviceId: string | null;
  twoStepPassed: boolean;
  hasTwoStep: boolean;
}

/** Refuses an actor whose role lacks a permission that only part of a route needs. */
export function requirePermission(actor: Actor, permission: Permission): void {
  if (!can(actor.role, permission)) throw new ApiError("not-allowed");
}
