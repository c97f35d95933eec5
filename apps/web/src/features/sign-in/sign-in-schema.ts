import { signIn } from "@emberladder/contract";

/** What is typed to sign in; the device is added when it is sent. */
export const signInSchema = signIn.body.omit({ device: true });
