/**
 * The content policy forbids eval, and zod tries it unless told not to before any schema is made. zod keeps its
 * settings under this global name, shared between its copies, so they can be set without fetching zod for the
 * first screens.
 */
export function forbidZodEval(): void {
  Object.assign(globalThis, { __zod_globalConfig: { jitless: true } });
}
