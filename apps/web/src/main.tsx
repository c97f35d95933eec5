import { StrictMode } from "react";
import { createRoot } from "react-dom/client";
import { z } from "zod";
import { App } from "#app/app.tsx";
import { startI18n } from "#lib/i18n.ts";
import { applyScheme } from "#lib/scheme.ts";
import "#styles/index.css";

// The content policy forbids eval; zod must know before any schema is used.
z.config({ jitless: true });
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
