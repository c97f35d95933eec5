import { accessSync, constants, existsSync } from "node:fs";
import { delimiter, join } from "node:path";
import { PlainError } from "./plain-error.mjs";
import { runCommand } from "./run-command.mjs";

/** Receives one line of progress. @typedef {(line: string) => void} Report */

// Debian keeps daemons in /usr/sbin, which is not in the PATH of an ordinary user.
const extraFolders = ["/usr/local/sbin", "/usr/sbin", "/sbin"];

/**
 * Finds a program by name.
 *
 * @param {string} name
 * @returns {string | undefined} its full path
 */
export function findProgram(name) {
  const folders = [...(process.env["PATH"] ?? "").split(delimiter), ...extraFolders].filter(Boolean);
  return folders.map((folder) => join(folder, name)).find((path) => isExecutable(path));
}

/**
 * Finds a program, or installs it from Debian's own packages when that is possible.
 *
 * @param {{ program: string, packages: string[], purpose: string, report: Report }} need `purpose` completes
 * the sentence "Emberladder needs ... "
 * @returns {Promise<string>} full path of the program
 * @throws {PlainError} with the command to run when this is not Debian, there is no root, or apt-get fails
 */
export async function ensureProgram({ program, packages, purpose, report }) {
  const present = findProgram(program);
  if (present !== undefined) return present;
  const command = `apt-get install -y --no-install-recommends ${packages.join(" ")}`;
  if (findProgram("apt-get") === undefined) {
    throw new PlainError(
      `Emberladder needs ${purpose} (the program ${program}), and this is not a Debian machine, so it cannot ` +
        `be installed from here. Install ${packages.join(", ")} with your system's package manager, then try again.`,
    );
  }
  if (process.getuid?.() !== 0) {
    throw new PlainError(
      `Emberladder needs ${purpose} (the program ${program}), and only root can install packages. ` +
        `Run this once, then try again:\n  sudo ${command}`,
    );
  }
  report(`installing ${packages.join(", ")} from Debian's packages`);
  await runApt(["update"]);
  await runApt(["install", "-y", "--no-install-recommends", ...packages]);
  const installed = findProgram(program);
  if (installed === undefined) {
    throw new PlainError(
      `apt-get installed ${packages.join(", ")}, but the program ${program} is still missing.`,
    );
  }
  return installed;
}

/**
 * Finds MariaDB's server and tools, or installs Debian's packages.
 *
 * @param {{ report: Report }} options
 * @returns {Promise<string>} full path of mariadbd
 * @throws {PlainError} as {@link ensureProgram}
 */
export async function ensureMariadb({ report }) {
  const server = await ensureProgram({
    program: "mariadbd",
    packages: ["mariadb-server"],
    purpose: "MariaDB, its database",
    report,
  });
  for (const program of ["mariadb-install-db", "mariadb"]) {
    await ensureProgram({
      program,
      packages: ["mariadb-server", "mariadb-client"],
      purpose: "MariaDB's own tools",
      report,
    });
  }
  return server;
}

/** @param {string[]} args */
async function runApt(args) {
  const result = await runCommand("apt-get", args, {
    env: { ...process.env, DEBIAN_FRONTEND: "noninteractive" },
  });
  if (result.code === 0) return;
  const reason = result.stderr.trim().split("\n").slice(-6).join("\n  ");
  throw new PlainError(`apt-get ${args.join(" ")} did not succeed. It said:\n  ${reason}`);
}

/** @param {string} path */
function isExecutable(path) {
  if (!existsSync(path)) return false;
  try {
    accessSync(path, constants.X_OK);
    return true;
  } catch {
    return false;
  }
}
