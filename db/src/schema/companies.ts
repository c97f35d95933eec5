import type { ALTITUDE_RULES } from "@emberladder/furnace";
import { boolean, foreignKey, index, int, mysqlTable, uniqueIndex, varchar } from "drizzle-orm/mysql-core";
import { code, createdAt, email, exactText, hex64, id, moment, name, uuid } from "./columns.ts";

type Role = "trainee" | "technician" | "senior" | "supervisor";

/** A company. Every other row belongs to one; `mode` keeps demo and live apart. */
export const companies = mysqlTable("companies", {
  id: id(),
  name: name().notNull(),
  timeZone: code("time_zone", { length: 64 }).notNull(),
  altitudeRule: code("altitude_rule", { length: 40 }).$type<(typeof ALTITUDE_RULES)[number]>().notNull(),
  unitsShown: code("units_shown", { length: 20 }).$type<"inch-pound" | "si">().notNull(),
  mode: code("mode", { length: 8 }).$type<"demo" | "live">().notNull(),
  /** The number the next call gets. */
  nextCallNumber: int("next_call_number").notNull().default(1),
  createdAt: createdAt(),
});

/** People who may sign in. An e-mail belongs to one person in the whole installation. */
export const people = mysqlTable(
  "people",
  {
    id: id(),
    companyId: uuid("company_id")
      .notNull()
      .references(() => companies.id),
    name: name().notNull(),
    email: email().notNull(),
    role: code("role", { length: 20 }).$type<Role>().notNull(),
    /** Argon2id; null until the invitation is accepted. */
    passwordHash: varchar("password_hash", { length: 255 }),
    disabledAt: moment("disabled_at"),
    /** Sealed with the installation's secret; a second one waits for its first code. */
    totpSecret: varchar("totp_secret", { length: 255 }),
    totpPending: varchar("totp_pending", { length: 255 }),
    totpConfirmedAt: moment("totp_confirmed_at"),
    lastSeenAt: moment("last_seen_at"),
    createdAt: createdAt(),
  },
  (t) => [uniqueIndex("people_email").on(t.email), uniqueIndex("people_company").on(t.companyId, t.id)],
);

/** A phone or desk of one person; the record of what happened on site is counted per device. */
export const devices = mysqlTable(
  "devices",
  {
    id: id(),
    companyId: uuid("company_id").notNull(),
    personId: uuid("person_id").notNull(),
    name: varchar("name", { length: 80 }).notNull(),
    registeredAt: moment("registered_at").notNull(),
    lastSeenAt: moment("last_seen_at").notNull(),
    revokedAt: moment("revoked_at"),
  },
  (t) => [
    uniqueIndex("devices_company").on(t.companyId, t.id),
    foreignKey({
      name: "devices_person",
      columns: [t.companyId, t.personId],
      foreignColumns: [people.companyId, people.id],
    }),
  ],
);

/** Sessions by the hash of their secret, so that a copy of this table opens nothing. */
export const sessions = mysqlTable(
  "sessions",
  {
    id: hex64("id").primaryKey(),
    userId: uuid("person_id")
      .notNull()
      .references(() => people.id),
    /** The absolute limit, which use never moves. */
    expiresAt: moment("expires_at").notNull(),
    publicId: uuid("public_id").notNull(),
    deviceId: uuid("device_id").references(() => devices.id),
    createdAt: createdAt(),
    lastUsedAt: moment("last_used_at").notNull(),
    twoStepPassed: boolean("two_step_passed").notNull(),
  },
  (t) => [index("sessions_person").on(t.userId), uniqueIndex("sessions_public").on(t.publicId)],
);

/** Links that work once: invitation, password reset, first run. Only the hash is kept. */
export const oneTimeTokens = mysqlTable(
  "one_time_tokens",
  {
    tokenHash: hex64("token_hash").primaryKey(),
    kind: code("kind", { length: 20 }).$type<"invite" | "reset" | "first-run">().notNull(),
    personId: uuid("person_id").references(() => people.id),
    expiresAt: moment("expires_at").notNull(),
    usedAt: moment("used_at"),
    createdAt: createdAt(),
  },
  (t) => [index("one_time_tokens_person").on(t.personId, t.kind)],
);

export const recoveryCodes = mysqlTable(
  "recovery_codes",
  {
    codeHash: hex64("code_hash").primaryKey(),
    personId: uuid("person_id")
      .notNull()
      .references(() => people.id),
    usedAt: moment("used_at"),
    createdAt: createdAt(),
  },
  (t) => [index("recovery_codes_person").on(t.personId)],
);

/** Time steps whose two-step code was used: a code works once. */
export const totpUsedSteps = mysqlTable(
  "totp_used_steps",
  {
    id: id(),
    personId: uuid("person_id")
      .notNull()
      .references(() => people.id),
    step: int("step").notNull(),
  },
  (t) => [uniqueIndex("totp_used_steps_once").on(t.personId, t.step)],
);

/** Failed sign-ins by a key of account and address: the delay before the next try. */
export const signInThrottles = mysqlTable("sign_in_throttles", {
  keyHash: hex64("key_hash").primaryKey(),
  attempts: int("attempts").notNull(),
  lastAttemptAt: moment("last_attempt_at").notNull(),
  blockedUntil: moment("blocked_until"),
});

/** Counts of the rate limits that several API processes share. */
export const rateWindows = mysqlTable("rate_windows", {
  keyHash: hex64("key_hash").primaryKey(),
  hits: int("hits").notNull(),
  resetsAt: moment("resets_at").notNull(),
});

/** Who did what, when: only ever added to. Bodies hold no secrets. */
export const auditLog = mysqlTable(
  "audit_log",
  {
    id: id(),
    companyId: uuid("company_id"),
    actorId: uuid("actor_id"),
    action: code("action", { length: 60 }).notNull(),
    subjectId: uuid("subject_id"),
    details: exactText("details").notNull(),
    requestId: uuid("request_id"),
    at: moment("at").notNull(),
  },
  (t) => [index("audit_log_company").on(t.companyId, t.at)],
);
