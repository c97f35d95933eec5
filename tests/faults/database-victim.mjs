/**
 * Starts a database, commits 200 rows one by one, and is killed at once, leaving the server running:
 * `node database-victim.mjs <folder>`.
 */
import { startDatabase } from "@emberladder/db/server";
import { createConnection } from "mysql2/promise";

const database = await startDatabase({ dataDir: process.argv[2] ?? "" });
const connection = await createConnection(database.migratorUrl);
await connection.query("create table readings (id int primary key)");
for (let id = 1; id <= 200; id += 1) await connection.query("insert into readings values (?)", [id]);
process.kill(process.pid, "SIGKILL");
