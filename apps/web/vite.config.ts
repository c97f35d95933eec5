import { fileURLToPath } from "node:url";
import tailwindcss from "@tailwindcss/vite";
import react from "@vitejs/plugin-react";
import { defineConfig } from "vite";

const framework =
  /node_modules\/(react|react-dom|scheduler|react-router|react-router-dom|@tanstack\/(react-query|query-core)|i18next|react-i18next|use-sync-external-store|html-parse-stringify)\//;
const forms =
  /node_modules\/react-hook-form\/|src\/components\/forms\/(form|field-shell|resolve-by|error-summary|list-errors|submit-button|use-issue-words|text-field|password-field|number-field|select-field)\./;
const firstScreens =
  /src\/(app\/|messages\/en\/(ui|shell)\.|lib\/(session|api-client|paths|scheme|use-title|problem-words|i18n|shell-routes|site-time|query-client|enter-session|kept-query|group-by|device-name)\.|components\/ui\/(wordmark|scheme-switch|button|act|list-states|page-head|shut-off-label|pager|call-dock)\.|components\/ladder\/(drawings|call-ladder)\.)/;

const apiTarget = process.env["API_TARGET"] ?? "http://127.0.0.1:4311";

export default defineConfig({
  root: fileURLToPath(new URL(".", import.meta.url)),
  plugins: [react(), tailwindcss()],
  build: {
    manifest: true,
    // The content policy allows no inline scripts, so nothing is inlined as a data address either.
    assetsInlineLimit: 0,
    modulePreload: { polyfill: false },
    rolldownOptions: {
      output: {
        // Three large files instead of forty small ones: fewer round trips on a slow line, and 10 kB less of gzip.
        codeSplitting: {
          groups: [
            { name: "framework", test: framework },
            { name: "forms", test: forms },
            { name: "first-screens", test: firstScreens },
          ],
        },
      },
    },
  },
  server: {
    host: "127.0.0.1",
    proxy: { "/api": apiTarget, "/dev": apiTarget, "/health": apiTarget },
  },
});
