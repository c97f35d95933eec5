export { demoId } from "./demo-id.ts";
export { demoCalls } from "./demo-calls.ts";
export { demoCompanies } from "./demo-people.ts";
export { seedDemo } from "./seed-demo.ts";
export type { DemoAccount } from "./seed-demo.ts";
export { profileOf } from "./reference-call.ts";
export type { ReferenceCall } from "./reference-call.ts";
export { recordOf } from "./reference-record.ts";
export type { RecordFrame, RecordStep } from "./reference-record.ts";
