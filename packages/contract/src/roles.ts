/**
 * Roles, permissions, and which role has which. The server judges every request by this table; the client
 * asks the same question to show or hide a control, and receives its own list with `me`.
 */

export const ROLES = ["trainee", "technician", "senior", "supervisor"] as const;
export type Role = (typeof ROLES)[number];

/** Roles that must pass a two-step code before anything else. */
export const TWO_STEP_ROLES: readonly Role[] = ["supervisor"];

const EVERYONE: readonly Role[] = ROLES;
const TRADE: readonly Role[] = ["technician", "senior", "supervisor"];
const DESK: readonly Role[] = ["senior", "supervisor"];
const LEAD: readonly Role[] = ["supervisor"];

/** Who may do what; one line an ability. */
export const PERMISSIONS = {
  "call:read": EVERYONE,
  "call:create": TRADE,
  "call:assign": DESK,
  "call:cancel": DESK,
  "unit:read": EVERYONE,
  "unit:write": TRADE,
  "customer:read": DESK,
  "customer:write": DESK,
  /** Append events to a diagnosis. A trainee's record is marked and looked at before anything is mailed. */
  "diagnosis:record": EVERYONE,
  "diagnosis:read": EVERYONE,
  /** The list of all diagnoses, for review. */
  "diagnosis:review": DESK,
  /** Let a flagged closing go to the customer after looking at it. */
  "diagnosis:release": LEAD,
  /** Erase a free text, with a recorded reason. */
  "note:erase": LEAD,
  "tree:read": EVERYONE,
  "company:read": EVERYONE,
  "company:update": LEAD,
  "person:list": DESK,
  "person:manage": LEAD,
  "device:revoke": LEAD,
  "job:read": LEAD,
  "job:manage": LEAD,
} as const satisfies Record<string, readonly Role[]>;

export type Permission = keyof typeof PERMISSIONS;

/** Whether a role has a permission. */
export function can(role: Role, permission: Permission): boolean {
  return PERMISSIONS[permission].includes(role);
}

/** All permissions of a role, as `me` sends them to the client. */
export function permissionsOf(role: Role): Permission[] {
  return (Object.keys(PERMISSIONS) as Permission[]).filter((permission) => can(role, permission));
}
