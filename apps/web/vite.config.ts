import { fileURLToPath } from "node:url";
import tailwindcss from "@tailwindcss/vite";
import react from "@vitejs/plugin-react";
import { defineConfig } from "vite";

const apiTarget = process.env["API_TARGET"] ?? "http://127.0.0.1:4311";

export default defineConfig({
  root: fileURLToPath(new URL(".", import.meta.url)),
  plugins: [react(), tailwindcss()],
  build: {
    manifest: true,
    // The content policy allows no inline scripts, so nothing is inlined as a data address either.
    assetsInlineLimit: 0,
    modulePreload: { polyfill: false },
  },
  server: {
    host: "127.0.0.1",
    proxy: { "/api": apiTarget, "/dev": apiTarget, "/health": apiTarget },
  },
});
