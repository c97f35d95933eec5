export * from "./codes.ts";
export * from "./variant.ts";
export * from "./parse-variant.ts";
export * from "./profile.ts";
export * from "./stages.ts";
export * from "./timings.ts";
export * from "./sights.ts";
export * from "./contact-voltage.ts";
