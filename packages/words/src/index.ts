export * from "./en.ts";
