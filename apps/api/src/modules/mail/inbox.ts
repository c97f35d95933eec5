import { readdir, readFile } from "node:fs/promises";
import { join } from "node:path";
import { notFound } from "#http/api-error.ts";
import { escapeHtml, page } from "#modules/system/page.ts";
import { storedMessageSchema } from "./stored-message.ts";
import type { StoredMessage } from "./stored-message.ts";

/** Messages shown at most; the newest. */
const SHOWN = 200;

async function readMessage(folder: string, file: string): Promise<StoredMessage | undefined> {
  try {
    const parsed = storedMessageSchema.safeParse(JSON.parse(await readFile(join(folder, file), "utf8")));
    return parsed.success ? parsed.data : undefined;
  } catch {
    return undefined;
  }
}

/** The demo's inbox as a page, newest first. */
export async function renderInbox(folder: string | undefined): Promise<string> {
  const files = folder === undefined ? [] : await readdir(folder).catch(() => []);
  const newest = files
    .filter((file) => file.endsWith(".json"))
    .toSorted()
    .toReversed()
    .slice(0, SHOWN);
  const messages = (await Promise.all(newest.map(async (file) => readMessage(folder ?? "", file)))).filter(
    (message) => message !== undefined,
  );
  const rows = messages.map(
    ({ id, receivedAt, to, subject }) =>
      `<tr><td>${new Date(receivedAt).toISOString()}</td><td>${escapeHtml(to.join(", "))}</td><td><a href="/dev/mail/${id}">${escapeHtml(subject)}</a></td></tr>`,
  );
  return page(
    "Mail that the demo sent",
    messages.length === 0
      ? "<p>Nothing yet. Invitations, password resets, assigned calls and reports arrive here.</p>"
      : `<table><thead><tr><th>Received (UTC)</th><th>To</th><th>Subject</th></tr></thead><tbody>${rows.join("")}</tbody></table>`,
  );
}

/** One message as a page, its links made to follow. @throws ApiError `not-found`. */
export async function renderMessage(folder: string | undefined, id: string): Promise<string> {
  const message = folder === undefined ? undefined : await readMessage(folder, `${id}.json`);
  if (!message) throw notFound();
  const text = escapeHtml(message.text).replaceAll(/https?:\/\/[^\s<]+/g, '<a href="$&">$&</a>');
  return page(
    message.subject,
    `<p>From ${escapeHtml(message.from)} to ${escapeHtml(message.to.join(", "))}</p><pre>${text}</pre><p><a href="/dev/mail">All mail</a></p>`,
  );
}
