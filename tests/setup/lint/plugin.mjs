import { importDirection } from "./import-direction.mjs";
import { noClockOrChance, noRawSql, sqlInRepositories } from "./server-rules.mjs";
import { clientLayers, noNumberInput, wordsFromCatalogue } from "./web-rules.mjs";

/** The project's own lint rules. Each message gives the reason. */
const plugin = {
  meta: { name: "emberladder" },
  rules: {
    "import-direction": importDirection,
    "client-layers": clientLayers,
    "no-number-input": noNumberInput,
    "words-from-catalogue": wordsFromCatalogue,
    "sql-in-repositories": sqlInRepositories,
    "no-raw-sql": noRawSql,
    "no-clock-or-chance": noClockOrChance,
  },
};

export default plugin;
