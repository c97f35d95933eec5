import type { OpenApiDocument } from "@emberladder/contract/openapi";
import { escapeHtml, page } from "./page.ts";

interface Operation {
  operationId?: string;
  summary?: string;
  description?: string;
  tags?: string[];
  requestBody?: unknown;
  parameters?: unknown[];
  responses?: Record<string, { description?: string; content?: Record<string, { schema?: unknown }> }>;
}

/** The API as a page to read: routes by subject, with who may call them and what they take and give. */
export function renderApiPage(document: OpenApiDocument): string {
  const operations = Object.entries(document.paths ?? {}).flatMap(([path, item]) =>
    Object.entries(item as Record<string, Operation>).map(([method, operation]) => ({
      path,
      method,
      operation,
    })),
  );
  const tags = [...new Set(operations.map(({ operation }) => operation.tags?.[0] ?? ""))];
  const sections = tags.map((tag) => {
    const own = operations.filter(({ operation }) => operation.tags?.[0] === tag);
    return `<h2 id="${slug(tag)}">${escapeHtml(tag)}</h2>${own.map(renderOperation).join("")}`;
  });
  const schemas = Object.entries(document.components?.schemas ?? {}).map(
    ([name, schema]) =>
      `<details id="schema-${escapeHtml(name)}"><summary>${escapeHtml(name)}</summary>${code(schema)}</details>`,
  );
  const contents = [...tags, "Shapes"].map(
    (tag) => `<li><a href="#${slug(tag)}">${escapeHtml(tag)}</a></li>`,
  );
  return page(
    "Emberladder API",
    `<p>${escapeHtml(document.info.description ?? "")} <a href="/api/openapi.json">The document itself (OpenAPI 3.1)</a>.</p>
<nav aria-label="Subjects"><ul>${contents.join("")}</ul></nav>
${sections.join("\n")}
<h2 id="${slug("Shapes")}">Shapes</h2>${schemas.join("\n")}`,
  );
}

function renderOperation({
  path,
  method,
  operation,
}: {
  path: string;
  method: string;
  operation: Operation;
}): string {
  const answers = Object.entries(operation.responses ?? {}).map(([status, { description = "", content }]) => {
    const words = escapeHtml(description)
      .replaceAll(/`([^`]+)`/g, "<code>$1</code>")
      .replaceAll("\n\n", "<br>");
    const schema = status.startsWith("2") ? content?.["application/json"]?.schema : undefined;
    return `<dt>${status}</dt><dd>${words}${schema ? code(schema) : ""}</dd>`;
  });
  return `<details id="${operation.operationId ?? ""}"><summary><code>${method.toUpperCase()} ${escapeHtml(path)}</code> ${escapeHtml(operation.summary ?? "")}</summary>
<p>${escapeHtml(operation.description ?? "")}</p>
${operation.parameters ? `<h3>Parameters</h3>${code(operation.parameters)}` : ""}
${operation.requestBody ? `<h3>Body</h3>${code(operation.requestBody)}` : ""}
<h3>Answers</h3><dl>${answers.join("")}</dl></details>`;
}

const code = (value: unknown) => `<pre tabindex="0">${escapeHtml(JSON.stringify(value, null, 2))}</pre>`;
const slug = (text: string) => text.toLowerCase().replaceAll(/[^a-z]+/g, "-");
