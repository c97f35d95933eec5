/** What a repair may touch: the rows that decide the light-off proof. */
export const TOUCH_ROWS = [
  "setting",
  "airflow",
  "flame",
  "draft",
  "control",
  "gas-joint",
  "gas-train",
  "safety",
  "restored",
] as const;
export type TouchRow = (typeof TOUCH_ROWS)[number];
