/** The server's own few pages: plain HTML with one style file, so that they keep the strict policy. */

/** Text for an HTML page. */
export function escapeHtml(text: string): string {
  return text
    .replaceAll("&", "&amp;")
    .replaceAll("<", "&lt;")
    .replaceAll(">", "&gt;")
    .replaceAll('"', "&quot;")
    .replaceAll("'", "&#39;");
}

/** A whole page around some HTML. */
export function page(title: string, body: string): string {
  return `<!doctype html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta name="viewport" content="width=device-width, initial-scale=1">
<title>${escapeHtml(title)}</title>
<link rel="stylesheet" href="/api/docs.css">
</head>
<body>
<main>
<h1>${escapeHtml(title)}</h1>
${body}
</main>
</body>
</html>
`;
}

/** Style of the server's own pages. Follows the system's light or dark. */
export const pageStyle = `:root { color-scheme: light dark; --ground: #f3f5f6; --surface: #ffffff; --ink: #14181b; --line: #b9c2c8; --link: #0b4f71; }
@media (prefers-color-scheme: dark) { :root { --ground: #14181b; --surface: #1d2327; --ink: #f0f3f5; --line: #4c565d; --link: #9ad2f0; } }
body { margin: 0; background: var(--ground); color: var(--ink); font: 16px/1.5 "IBM Plex Sans", system-ui, sans-serif; }
main { max-width: 64rem; margin: 0 auto; padding: 16px; }
a { color: var(--link); }
a:focus-visible, summary:focus-visible, pre:focus-visible { outline: 3px solid var(--link); outline-offset: 2px; }
nav ul { display: flex; flex-wrap: wrap; gap: 8px 16px; padding: 0; list-style: none; }
details { background: var(--surface); border: 1px solid var(--line); border-radius: 4px; margin: 8px 0; padding: 8px 12px; }
summary { cursor: pointer; min-height: 32px; }
code, pre { font: 14px/1.45 "IBM Plex Mono", ui-monospace, monospace; }
pre { overflow: auto; max-height: 24rem; background: var(--ground); padding: 8px; white-space: pre-wrap; }
dt { font-weight: 600; }
dd { margin: 0 0 8px 16px; }
h2 { margin-top: 32px; }
h3 { font-size: 1rem; margin: 12px 0 4px; }
table { border-collapse: collapse; width: 100%; }
th, td { border-bottom: 1px solid var(--line); padding: 8px; text-align: left; vertical-align: top; }
`;
