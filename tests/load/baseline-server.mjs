/**
 * The baseline of the benchmark: Express and mysql2 and nothing else. `POST /rows` takes rows of the events table
 * as JSON and inserts them in one transaction. Reads DATABASE_URL and PORT.
 */
import express from "express";
import { createPool } from "mysql2/promise";

const pool = createPool({ uri: process.env["DATABASE_URL"] ?? "", connectionLimit: 12, timezone: "Z" });
const app = express();
app.disable("x-powered-by");
app.set("etag", false);

app.post("/rows", express.json({ limit: "1mb" }), (request, response, next) => {
  insertRows(/** @type {unknown[][]} */ (request.body)).then(
    (inserted) => response.status(200).json({ inserted }),
    next,
  );
});

/** @param {unknown[][]} rows */
async function insertRows(rows) {
  const connection = await pool.getConnection();
  try {
    await connection.beginTransaction();
    await connection.query("insert into baseline_events values ?", [rows]);
    await connection.commit();
  } finally {
    connection.release();
  }
  return rows.length;
}

const server = app.listen(Number(process.env["PORT"]), "127.0.0.1");
process.on("SIGTERM", () => {
  server.closeAllConnections();
  server.close(() => void pool.end().then(() => process.exit(0)));
});
