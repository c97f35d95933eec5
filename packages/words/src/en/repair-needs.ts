import type { RepairNeeds } from "@emberladder/furnace";

/** Whom a repair needs besides the technician. */
export const repairNeeds: Readonly<Record<RepairNeeds, string>> = {
  utility: "Gas utility only",
  "gas-supplier": "Gas supplier",
  electrician: "Electrician",
  owner: "Owner's leave",
  "fire-authority": "Authorised person only",
  permit: "A permit may be needed",
};
