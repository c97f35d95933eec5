import {
  bigint,
  boolean,
  foreignKey,
  index,
  int,
  mysqlTable,
  uniqueIndex,
  varchar,
} from "drizzle-orm/mysql-core";
import { code, createdAt, exactText, hex64, id, moment, uuid } from "./columns.ts";
import { companies, devices, people } from "./companies.ts";
import { calls, units } from "./sites.ts";

/**
 * One diagnosis: the head of its chain, locked while events are appended, and projections of its events that
 * lists read. Everything but `id`, the company, the head and the release can be rebuilt from the events.
 */
export const diagnoses = mysqlTable(
  "diagnoses",
  {
    id: id(),
    companyId: uuid("company_id")
      .notNull()
      .references(() => companies.id),
    serverSeq: int("server_seq").notNull(),
    chainHash: hex64("chain_hash").notNull(),
    callId: uuid("call_id").notNull(),
    unitId: uuid("unit_id").notNull(),
    technicianId: uuid("technician_id").notNull(),
    status: code("status", { length: 10 }).$type<"open" | "closed">().notNull(),
    outcome: code("outcome", { length: 40 }),
    lastStage: code("last_stage", { length: 40 }),
    openedAt: moment("opened_at").notNull(),
    lastEventAt: moment("last_event_at").notNull(),
    closedAt: moment("closed_at"),
    flags: int("flags").notNull(),
    /** Closed with a flag, and no supervisor has looked yet. */
    waitsForRelease: boolean("waits_for_release").notNull(),
    /** The closing asks for a report to the customer. */
    wantsReport: boolean("wants_report").notNull(),
    isDemo: boolean("is_demo").notNull(),
  },
  (t) => [
    uniqueIndex("diagnoses_company").on(t.companyId, t.id),
    index("diagnoses_when").on(t.companyId, t.openedAt),
    index("diagnoses_unit").on(t.companyId, t.unitId, t.openedAt),
    index("diagnoses_call").on(t.companyId, t.callId),
    foreignKey({
      name: "diagnoses_call_of",
      columns: [t.companyId, t.callId],
      foreignColumns: [calls.companyId, calls.id],
    }),
    foreignKey({
      name: "diagnoses_unit_of",
      columns: [t.companyId, t.unitId],
      foreignColumns: [units.companyId, units.id],
    }),
    foreignKey({
      name: "diagnoses_technician",
      columns: [t.companyId, t.technicianId],
      foreignColumns: [people.companyId, people.id],
    }),
  ],
);

/** The record itself: only ever added to; the application's database user can do nothing else. */
export const events = mysqlTable(
  "events",
  {
    id: id(),
    companyId: uuid("company_id").notNull(),
    diagnosisId: uuid("diagnosis_id").notNull(),
    deviceId: uuid("device_id").notNull(),
    deviceSeq: bigint("device_seq", { mode: "number" }).notNull(),
    serverSeq: int("server_seq").notNull(),
    type: code("type", { length: 64 }).notNull(),
    schemaVersion: int("schema_version").notNull(),
    /** The text that was hashed (RFC 8785), exactly. */
    canonicalText: exactText("canonical_text").notNull(),
    hash: hex64("hash").notNull(),
    prevHash: hex64("prev_hash").notNull(),
    chainHash: hex64("chain_hash").notNull(),
    actorId: uuid("actor_id").notNull(),
    receivedAt: moment("received_at").notNull(),
  },
  (t) => [
    uniqueIndex("events_server_seq").on(t.diagnosisId, t.serverSeq),
    uniqueIndex("events_device_seq").on(t.deviceId, t.deviceSeq),
    foreignKey({
      name: "events_diagnosis",
      columns: [t.companyId, t.diagnosisId],
      foreignColumns: [diagnoses.companyId, diagnoses.id],
    }),
    foreignKey({
      name: "events_device",
      columns: [t.companyId, t.deviceId],
      foreignColumns: [devices.companyId, devices.id],
    }),
  ],
);

/** Rules that an event breaks, found when it was received. */
export const eventFlags = mysqlTable(
  "event_flags",
  {
    id: id(),
    companyId: uuid("company_id").notNull(),
    diagnosisId: uuid("diagnosis_id").notNull(),
    eventId: uuid("event_id").notNull(),
    rule: code("rule", { length: 80 }).notNull(),
    params: exactText("params"),
    createdAt: createdAt(),
  },
  (t) => [
    index("event_flags_diagnosis").on(t.diagnosisId),
    foreignKey({
      name: "event_flags_diagnosis_of",
      columns: [t.companyId, t.diagnosisId],
      foreignColumns: [diagnoses.companyId, diagnoses.id],
    }),
  ],
);

/** Free texts, referenced from events by salted hash, so that one can be erased and the chain still holds. */
export const noteTexts = mysqlTable(
  "note_texts",
  {
    id: id(),
    companyId: uuid("company_id").notNull(),
    diagnosisId: uuid("diagnosis_id").notNull(),
    hash: hex64("hash").notNull(),
    salt: varchar("salt", { length: 32 }).notNull(),
    /** Null once erased. */
    text: exactText("text"),
    erasedAt: moment("erased_at"),
    erasedBy: uuid("erased_by").references(() => people.id),
    eraseReason: varchar("erase_reason", { length: 500 }),
    createdAt: createdAt(),
  },
  (t) => [
    uniqueIndex("note_texts_hash").on(t.diagnosisId, t.hash),
    foreignKey({
      name: "note_texts_diagnosis",
      columns: [t.companyId, t.diagnosisId],
      foreignColumns: [diagnoses.companyId, diagnoses.id],
    }),
  ],
);

/** The customer's report of one diagnosis: its words as made, and the PDF beside it. */
export const reports = mysqlTable(
  "reports",
  {
    id: id(),
    companyId: uuid("company_id").notNull(),
    diagnosisId: uuid("diagnosis_id").notNull(),
    content: exactText("content").notNull(),
    /** File name in the data folder; null until the PDF is made. */
    pdfFile: varchar("pdf_file", { length: 80 }),
    madeAt: moment("made_at").notNull(),
  },
  (t) => [
    index("reports_diagnosis").on(t.diagnosisId, t.madeAt),
    foreignKey({
      name: "reports_diagnosis_of",
      columns: [t.companyId, t.diagnosisId],
      foreignColumns: [diagnoses.companyId, diagnoses.id],
    }),
  ],
);

/** Private links to a report; only the hash is kept, the link itself exists in the customer's mail alone. */
export const reportLinks = mysqlTable("report_links", {
  tokenHash: hex64("token_hash").primaryKey(),
  reportId: uuid("report_id")
    .notNull()
    .references(() => reports.id),
  expiresAt: moment("expires_at").notNull(),
  createdAt: createdAt(),
});
