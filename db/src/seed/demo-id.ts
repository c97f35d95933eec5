import { v5 as uuidv5 } from "uuid";

/** Namespace of the demo's ids: an arbitrary fixed id. */
const NAMESPACE = "6f0b6a3e-6f2b-5c0e-9a51-3f6a3c5f7d10";

/** The id of a demo row by its name, the same at every seeding, so that seeding again changes nothing. */
export function demoId(kind: string, slug: string): string {
  return uuidv5(`${kind}/${slug}`, NAMESPACE);
}
