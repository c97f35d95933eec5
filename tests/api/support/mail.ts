import { readdir, readFile } from "node:fs/promises";
import type { AddressInfo } from "node:net";
import { join } from "node:path";
import { createMailServer } from "@emberladder/api/src/dev/create-mail-server.ts";
import { runNextJob } from "@emberladder/api/src/modules/jobs/run-next-job.ts";
import { createMailer } from "@emberladder/api/src/modules/mail/mailer.ts";
import { storedMessageSchema } from "@emberladder/api/src/modules/mail/stored-message.ts";
import type { StoredMessage } from "@emberladder/api/src/modules/mail/stored-message.ts";
import type { TestServer } from "./test-server.ts";

/** A mail server that keeps what it gets, and a worker that sends to it. */
export interface TestPost {
  /** Runs every job that is due. */
  workOff: () => Promise<void>;
  /** Messages to one address, oldest first. */
  messagesTo: (address: string) => Promise<StoredMessage[]>;
  close: () => Promise<void>;
}

/** Starts a mail server over the test server's own mail folder, and a worker beside it. */
export async function startPost(server: TestServer): Promise<TestPost> {
  const folder = server.dependencies.environment.mailDir ?? "";
  const smtp = createMailServer(folder);
  await new Promise<void>((resolve) => {
    smtp.listen(0, "127.0.0.1", resolve);
  });
  const { port } = smtp.server.address() as AddressInfo;
  const mailer = createMailer({
    smtpUrl: `smtp://127.0.0.1:${port}`,
    mailFrom: "Emberladder <no-reply@emberladder.example>",
  });
  return {
    workOff: async () => {
      let isMore = true;
      while (isMore) isMore = await runNextJob({ ...server.dependencies, mailer });
    },
    messagesTo: async (address) => {
      const files = (await readdir(folder).catch(() => [])).filter((file) => file.endsWith(".json"));
      const messages = await Promise.all(
        files.map(async (file) =>
          storedMessageSchema.parse(JSON.parse(await readFile(join(folder, file), "utf8"))),
        ),
      );
      return messages
        .filter(({ to }) => to.includes(address))
        .toSorted((a, b) => a.receivedAt - b.receivedAt);
    },
    close: async () => {
      mailer.close();
      await new Promise<void>((resolve) => {
        smtp.close(resolve);
      });
    },
  };
}

/** The secret of the first link of a kind in a message. */
export function tokenIn(text: string, kind: "invite" | "reset" | "r"): string {
  return new RegExp(`/${kind}/([A-Za-z0-9_-]{43})`).exec(text)?.[1] ?? "no link";
}
