export * from "./envelope.ts";
