export * from "./codes.ts";
export * from "./variant.ts";
export * from "./parse-variant.ts";
export * from "./profile.ts";
export * from "./stages.ts";
