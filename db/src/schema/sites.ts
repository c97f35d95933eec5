import type { UnitProfile } from "@emberladder/furnace";
import { foreignKey, index, int, json, mysqlTable, uniqueIndex, varchar } from "drizzle-orm/mysql-core";
import { code, createdAt, email, id, moment, name, uuid } from "./columns.ts";
import { companies, people } from "./companies.ts";

/** Customers. Their names and addresses stay out of the record's events. */
export const customers = mysqlTable(
  "customers",
  {
    id: id(),
    companyId: uuid("company_id")
      .notNull()
      .references(() => companies.id),
    firstName: name("first_name").notNull(),
    lastName: name("last_name"),
    email: email(),
    phone: varchar("phone", { length: 40 }),
    createdAt: createdAt(),
  },
  (t) => [
    uniqueIndex("customers_company").on(t.companyId, t.id),
    index("customers_name").on(t.companyId, t.lastName, t.firstName),
  ],
);

export const sites = mysqlTable(
  "sites",
  {
    id: id(),
    companyId: uuid("company_id").notNull(),
    customerId: uuid("customer_id").notNull(),
    address: varchar("address", { length: 200 }).notNull(),
    town: name("town").notNull(),
    region: name("region"),
    postalCode: varchar("postal_code", { length: 20 }),
    timeZone: code("time_zone", { length: 64 }),
    altitudeFt: int("altitude_ft"),
    accessNote: varchar("access_note", { length: 500 }),
    createdAt: createdAt(),
  },
  (t) => [
    uniqueIndex("sites_company").on(t.companyId, t.id),
    foreignKey({
      name: "sites_customer",
      columns: [t.companyId, t.customerId],
      foreignColumns: [customers.companyId, customers.id],
    }),
  ],
);

export const units = mysqlTable(
  "units",
  {
    id: id(),
    companyId: uuid("company_id").notNull(),
    siteId: uuid("site_id").notNull(),
    name: name().notNull(),
    profile: json("profile").$type<UnitProfile>().notNull(),
    /** Counts changes, so that two people do not overwrite each other unseen. */
    version: int("version").notNull().default(1),
    createdAt: createdAt(),
  },
  (t) => [
    uniqueIndex("units_company").on(t.companyId, t.id),
    foreignKey({
      name: "units_site",
      columns: [t.companyId, t.siteId],
      foreignColumns: [sites.companyId, sites.id],
    }),
  ],
);

export const calls = mysqlTable(
  "calls",
  {
    id: id(),
    companyId: uuid("company_id").notNull(),
    number: int("number").notNull(),
    unitId: uuid("unit_id").notNull(),
    assignedTo: uuid("assigned_to"),
    status: code("status", { length: 20 }).$type<"open" | "under-way" | "done" | "cancelled">().notNull(),
    complaint: varchar("complaint", { length: 500 }).notNull(),
    scheduledFor: moment("scheduled_for").notNull(),
    version: int("version").notNull().default(1),
    createdBy: uuid("created_by"),
    createdAt: createdAt(),
    doneAt: moment("done_at"),
  },
  (t) => [
    uniqueIndex("calls_company").on(t.companyId, t.id),
    uniqueIndex("calls_number").on(t.companyId, t.number),
    index("calls_when").on(t.companyId, t.scheduledFor),
    foreignKey({
      name: "calls_unit",
      columns: [t.companyId, t.unitId],
      foreignColumns: [units.companyId, units.id],
    }),
    foreignKey({
      name: "calls_assigned_to",
      columns: [t.companyId, t.assignedTo],
      foreignColumns: [people.companyId, people.id],
    }),
  ],
);
