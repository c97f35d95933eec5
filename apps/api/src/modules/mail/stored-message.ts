import { z } from "zod";

/** A message as the demo's mail server keeps it, one file each. */
export const storedMessageSchema = z.strictObject({
  id: z.string().regex(/^[0-9a-z-]{1,64}$/),
  receivedAt: z.number().int(),
  from: z.string(),
  to: z.array(z.string()),
  subject: z.string(),
  text: z.string(),
});
export type StoredMessage = z.infer<typeof storedMessageSchema>;
