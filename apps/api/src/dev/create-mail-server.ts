import { randomUUID } from "node:crypto";
import { mkdir, rename, writeFile } from "node:fs/promises";
import { join } from "node:path";
import type { Readable } from "node:stream";
import { simpleParser } from "mailparser";
import type { AddressObject } from "mailparser";
import { SMTPServer } from "smtp-server";
import type { StoredMessage } from "#modules/mail/stored-message.ts";

/**
 * The demo's own mail server: takes every message on the loopback address and keeps it as a file, for the
 * inbox page to show. Nothing leaves the machine.
 */
export function createMailServer(folder: string): SMTPServer {
  return new SMTPServer({
    authOptional: true,
    disabledCommands: ["AUTH", "STARTTLS"],
    size: 5 * 1024 * 1024,
    onData: (stream, _session, done) => {
      void takeMail(folder, stream, done);
    },
  });
}

async function takeMail(
  folder: string,
  stream: Readable,
  done: (error?: Error | null) => void,
): Promise<void> {
  try {
    const mail = await simpleParser(stream);
    const receivedAt = Date.now();
    await keep(folder, {
      id: `${receivedAt}-${randomUUID()}`,
      receivedAt,
      from: mail.from?.text ?? "",
      to: addressesOf(mail.to),
      subject: mail.subject ?? "(no subject)",
      text: mail.text ?? "",
    });
    done();
  } catch {
    done(new Error("The message could not be kept."));
  }
}

function addressesOf(to: AddressObject | AddressObject[] | undefined): string[] {
  return [to ?? []].flat().flatMap(({ value }) => value.flatMap(({ address }) => address ?? []));
}

async function keep(folder: string, message: StoredMessage): Promise<void> {
  await mkdir(folder, { recursive: true, mode: 0o700 });
  const path = join(folder, `${message.id}.json`);
  await writeFile(`${path}.part`, JSON.stringify(message, null, 2), { mode: 0o600 });
  await rename(`${path}.part`, path);
}
