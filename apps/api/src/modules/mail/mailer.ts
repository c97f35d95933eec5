import { createTransport } from "nodemailer";
import type { Environment } from "#config/environment.ts";

export interface Message {
  to: string;
  subject: string;
  text: string;
}

/** Hands messages to the mail server. */
export interface Mailer {
  send: (message: Message) => Promise<void>;
  close: () => void;
}

/** The mailer of an installation, over SMTP. */
export function createMailer({ smtpUrl, mailFrom }: Pick<Environment, "smtpUrl" | "mailFrom">): Mailer {
  const isLocal = smtpUrl !== undefined && /^smtp:\/\/(?:127\.0\.0\.1|localhost|\[::1\])/.test(smtpUrl);
  const transport = createTransport(smtpUrl ?? "smtp://127.0.0.1:25", {
    from: mailFrom,
    // On this machine the way is not open to others; anywhere else mail goes out only over TLS.
    ...(isLocal ? { ignoreTLS: true } : { requireTLS: true }),
    connectionTimeout: 10_000,
    socketTimeout: 20_000,
  } as object);
  return {
    send: async (message) => {
      // One recipient as it is: an address can never add headers or further recipients.
      await transport.sendMail({ ...message, to: { name: "", address: message.to } });
    },
    close: () => transport.close(),
  };
}
