export * from "./convert-units.ts";
export * from "./display-reading.ts";
export * from "./altitude.ts";
export * from "./gas-flow.ts";
export * from "./combustion.ts";
export * from "./airflow.ts";
