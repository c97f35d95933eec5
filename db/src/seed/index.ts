export { demoId } from "./demo-id.ts";
export { demoCalls } from "./demo-calls.ts";
export { demoCompanies } from "./demo-people.ts";
export { seedDemo } from "./seed-demo.ts";
export type { DemoAccount } from "./seed-demo.ts";
