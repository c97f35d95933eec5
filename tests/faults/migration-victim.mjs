/**
 * Migrates and kills itself, as a power cut would, at one step:
 * `node migration-victim.mjs <url> <folder> <phase> <count>` dies at the count-th time it reaches the phase.
 */
import { applyMigrations } from "@emberladder/db/migrate";

const [, , url = "", folder = "", phase = "executed", count = "1"] = process.argv;
let reached = 0;

await applyMigrations({
  url,
  folder,
  onPhase: (current) => {
    if (current !== phase) return;
    reached += 1;
    if (reached === Number(count)) process.kill(process.pid, "SIGKILL");
  },
});
