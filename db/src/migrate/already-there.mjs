/**
 * What MariaDB says when a statement's effect is there already. MariaDB commits every schema statement by
 * itself, and since 10.6 each one happens whole or not at all, so these answers to a statement that was started
 * and never recorded as finished mean: it had succeeded.
 *
 * Numbers: MariaDB error code reference, from memory; a test that kills a migration provokes them.
 */
const alwaysDone = new Set([
  1050, // table exists
  1051, // unknown table, to a DROP TABLE
  1060, // duplicate column name
  1061, // duplicate key name
  1068, // multiple primary key defined
  1091, // can't drop, it does not exist
  1826, // duplicate constraint name
]);

/**
 * Tells whether an error to a repeated schema statement means that the first attempt had worked.
 *
 * @param {string} sql the statement
 * @param {{ errno?: number, message?: string }} error as mysql2 throws it
 * @returns {boolean}
 */
export function isAlreadyThere(sql, error) {
  const errno = error.errno ?? 0;
  if (alwaysDone.has(errno)) return true;
  // A foreign key whose name is taken is reported by the storage engine as its own error 121.
  if (errno === 1005 && /errno: 121\b/.test(error.message ?? "")) return true;
  if (/^\s*rename\s+table\b/i.test(sql)) return errno === 1146;
  if (/\brename\s+column\b/i.test(sql)) return errno === 1054;
  return false;
}

/**
 * Tells whether a statement changes rows only, so that it can share a transaction with the record of it.
 *
 * @param {string} sql
 * @returns {boolean}
 */
export function changesRowsOnly(sql) {
  return /^\s*(insert|update|delete|replace)\b/i.test(sql.replace(/^(\s*--[^\n]*\n)+/, ""));
}
