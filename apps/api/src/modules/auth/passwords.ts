import { MIN_PASSWORD_ALONE, MIN_PASSWORD_WITH_TWO_STEP } from "@emberladder/contract";
import { Argon2id } from "oslo/password";
import { ApiError } from "#http/api-error.ts";
import { isCommonPassword } from "./common-passwords.ts";

/** Hashes at once at most: each takes 19 MiB and a tenth of a second of a core. */
const PARALLEL_HASHES = 4;

// Argon2id with 19 MiB, 2 passes, 1 lane: the least that OWASP's cheat sheet accepts (from memory).
const argon = new Argon2id({ memorySize: 19_456, iterations: 2, parallelism: 1 });

/** Hash of a random text that nobody knows: compared against where the account does not exist. */
const NOBODY =
  "$argon2id$v=19$m=19456,t=2,p=1$WKXfDaS83lC6dEUtKO+sfA$dCsmh7vXWkMpm0DrOYJJmLRvxR4Ssr+JlhThbqF028w";

let running = 0;
const waiting: (() => void)[] = [];

async function inTurn<T>(work: () => Promise<T>): Promise<T> {
  if (running >= PARALLEL_HASHES) await new Promise<void>((resolve) => waiting.push(resolve));
  else running += 1;
  try {
    return await work();
  } finally {
    const next = waiting.shift();
    if (next) next();
    else running -= 1;
  }
}

/** Hashes a password with Argon2id, the whole of it, however long. */
export async function hashPassword(password: string): Promise<string> {
  return inTurn(async () => argon.hash(password));
}

/**
 * Whether a password is the one that was hashed. Without a hash it takes the same time and says no, so that an
 * unknown e-mail cannot be told from a wrong password.
 */
export async function verifyPassword(hash: string | null, password: string): Promise<boolean> {
  return inTurn(async () => {
    try {
      const isRight = await argon.verify(hash ?? NOBODY, password);
      return isRight && hash !== null;
    } catch {
      // A hash that cannot be read opens nothing.
      return false;
    }
  });
}

/**
 * Refuses a password that is too short for its factors, is guessed first by everybody, or is made of what
 * anybody knows about the account.
 * @throws ApiError `weak-password`.
 */
export function requireStrongPassword(
  password: string,
  { hasTwoStep, known }: { hasTwoStep: boolean; known: string[] },
): void {
  const least = hasTwoStep ? MIN_PASSWORD_WITH_TWO_STEP : MIN_PASSWORD_ALONE;
  if (Array.from(password).length < least)
    throw new ApiError("weak-password", {
      detail: `Use at least ${least} characters. Three or four words together are easy to keep.`,
    });
  if (isCommonPassword(password, known))
    throw new ApiError("weak-password", { detail: "That one is among the first that anybody would try." });
}
