export * from "./columns.ts";
export * from "./companies.ts";
export * from "./diagnoses.ts";
export * from "./jobs.ts";
export * from "./sites.ts";
