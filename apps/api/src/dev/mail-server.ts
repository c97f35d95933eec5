import { createMailServer } from "./create-mail-server.ts";

const { SMTP_PORT: port, MAIL_DIR: folder } = process.env;
if (!port || !folder) {
  process.stderr.write("The demo's mail server needs SMTP_PORT and MAIL_DIR.\n");
  process.exit(1);
}
const server = createMailServer(folder);
server.on("error", (error) => {
  process.stderr.write(`The demo's mail server cannot run: ${error.message}\n`);
  process.exit(1);
});
server.listen(Number(port), "127.0.0.1");
const stop = (): void => {
  server.close(() => process.exit(0));
  setTimeout(() => process.exit(0), 1000).unref();
};
process.on("SIGTERM", stop);
process.on("SIGINT", stop);
