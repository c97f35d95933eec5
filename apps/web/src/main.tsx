import { StrictMode } from "react";
import { createRoot } from "react-dom/client";
import { App } from "#app/app.tsx";
import { startI18n } from "#lib/i18n.ts";
import { applyScheme } from "#lib/scheme.ts";
import { forbidZodEval } from "#lib/forbid-zod-eval.ts";
import "#styles/index.css";

forbidZodEval();
applyScheme();
await startI18n();

const root = document.getElementById("root");
if (root) {
  createRoot(root).render(
    <StrictMode>
      <App />
    </StrictMode>,
  );
}
