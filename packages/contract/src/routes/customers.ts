import { z } from "zod";
import { unitProfileSchema } from "@emberladder/furnace";
import { MAX_ADDRESS, MAX_NAME, MAX_REASON } from "../limits.ts";
import { defineContract } from "../route-contract.ts";
import {
  emailField,
  idField,
  lineOf,
  pageOf,
  pageQuery,
  phoneField,
  textOf,
  timeZoneField,
} from "../schemas/fields.ts";

const tag = "Customers";

export const siteFieldsSchema = z.strictObject({
  address: lineOf(MAX_ADDRESS, "the street address"),
  town: lineOf(MAX_NAME, "the town"),
  region: lineOf(MAX_NAME, "the state or province").nullable().default(null),
  postalCode: lineOf(20, "the postal code").nullable().default(null),
  /** Null: the company's own time zone. */
  timeZone: timeZoneField.nullable().default(null),
  altitudeFt: z.number().int().min(-1500).max(15_000).nullable().default(null),
  /** How to get in; shown on site, so no alarm or door codes. */
  accessNote: textOf(MAX_REASON, "how to get in").nullable().default(null),
});

export const siteSchema = siteFieldsSchema.extend({ id: idField, customerId: idField }).meta({ id: "Site" });
export type Site = z.infer<typeof siteSchema>;

export const customerFieldsSchema = z.strictObject({
  firstName: lineOf(MAX_NAME, "a first name or the name of a business"),
  lastName: lineOf(MAX_NAME, "a last name").nullable().default(null),
  email: emailField.nullable().default(null),
  phone: phoneField.nullable().default(null),
});

export const customerSchema = customerFieldsSchema.extend({ id: idField }).meta({ id: "Customer" });
export type Customer = z.infer<typeof customerSchema>;

export const unitSummarySchema = z
  .strictObject({
    id: idField,
    siteId: idField,
    name: z.string(),
    profile: unitProfileSchema,
    /** Counts changes; send it back with a change. */
    version: z.number().int(),
  })
  .meta({ id: "Unit" });
export type UnitSummary = z.infer<typeof unitSummarySchema>;

export const customerDetailSchema = customerSchema
  .extend({ sites: z.array(siteSchema.extend({ units: z.array(unitSummarySchema) })) })
  .meta({ id: "CustomerDetail" });

const params = z.strictObject({ customerId: idField });

export const listCustomers = defineContract({
  method: "get",
  path: "/api/customers",
  access: "customer:read",
  tag,
  summary: "Customers by name; `search` looks in names, e-mail, address and town.",
  query: z.strictObject({ search: z.string().trim().max(100).optional(), ...pageQuery }),
  answer: {
    kind: "json",
    status: 200,
    schema: pageOf(customerSchema.extend({ siteCount: z.number().int() }).meta({ id: "CustomerRow" })),
  },
});

export const createCustomer = defineContract({
  method: "post",
  path: "/api/customers",
  access: "customer:write",
  tag,
  summary: "Add a customer, with a first site where it is known.",
  body: customerFieldsSchema.extend({ site: siteFieldsSchema.optional() }),
  answer: { kind: "json", status: 201, schema: customerDetailSchema },
});

export const readCustomer = defineContract({
  method: "get",
  path: "/api/customers/{customerId}",
  access: "customer:read",
  tag,
  summary: "One customer with sites and units.",
  params,
  answer: { kind: "json", status: 200, schema: customerDetailSchema },
  errors: ["not-found"],
});

export const updateCustomer = defineContract({
  method: "patch",
  path: "/api/customers/{customerId}",
  access: "customer:write",
  tag,
  summary: "Change a customer's name or how to reach them.",
  params,
  body: z
    .strictObject({
      firstName: customerFieldsSchema.shape.firstName,
      lastName: customerFieldsSchema.shape.lastName.unwrap(),
      email: customerFieldsSchema.shape.email.unwrap(),
      phone: customerFieldsSchema.shape.phone.unwrap(),
    })
    .partial(),
  answer: { kind: "json", status: 200, schema: customerDetailSchema },
  errors: ["not-found"],
});

export const createSite = defineContract({
  method: "post",
  path: "/api/customers/{customerId}/sites",
  access: "customer:write",
  tag,
  summary: "Add a site to a customer.",
  params,
  body: siteFieldsSchema,
  answer: { kind: "json", status: 201, schema: siteSchema },
  errors: ["not-found"],
});

export const updateSite = defineContract({
  method: "patch",
  path: "/api/sites/{siteId}",
  access: "customer:write",
  tag,
  summary: "Change a site.",
  params: z.strictObject({ siteId: idField }),
  body: z
    .strictObject({
      address: siteFieldsSchema.shape.address,
      town: siteFieldsSchema.shape.town,
      region: siteFieldsSchema.shape.region.unwrap(),
      postalCode: siteFieldsSchema.shape.postalCode.unwrap(),
      timeZone: siteFieldsSchema.shape.timeZone.unwrap(),
      altitudeFt: siteFieldsSchema.shape.altitudeFt.unwrap(),
      accessNote: siteFieldsSchema.shape.accessNote.unwrap(),
    })
    .partial(),
  answer: { kind: "json", status: 200, schema: siteSchema },
  errors: ["not-found"],
});
