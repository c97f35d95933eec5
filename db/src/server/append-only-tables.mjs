/**
 * Tables in which the application may add and read rows but never change or remove one. The database itself
 * refuses, so that no mistake in the application can rewrite the record.
 *
 * @type {readonly string[]}
 */
export const appendOnlyTables = ["events", "audit_log"];

/**
 * Tables that belong to the migrator. The application may read them, to tell whether the schema is complete.
 *
 * @type {readonly string[]}
 */
export const migrationTables = ["migration_lease", "migration_statement"];
