import * as language from "@zxcvbn-ts/language-common";

/** Words of this trade and product: the first that somebody who knows the company would try. */
const CONTEXT_WORDS = [
  "emberladder",
  "furnace",
  "heating",
  "technician",
  "supervisor",
  "password",
  "welcome",
  "letmein",
];

const LEETSPEAK: Readonly<Record<string, string>> = {
  "0": "o",
  "1": "i",
  "3": "e",
  "4": "a",
  "5": "s",
  "7": "t",
  "@": "a",
  $: "s",
  "!": "i",
};

let common: Set<string> | undefined;

/** The list is read at the first use: some thirty thousand words that most programs never need. */
function commonPasswords(): Set<string> {
  // Under Node's own loader the list arrives as a default export, in a bundle by name.
  const { dictionary } =
    "dictionary" in language ? language : (language as { default: typeof language }).default;
  common ??= new Set(dictionary.passwords.map((word) => word.toLowerCase()));
  return common;
}

/**
 * Whether a password is one that is guessed first: a common one, a common one with digits around it or
 * repeated, one character over and over, or made of what is known about the account.
 *
 * @param known words about the account: name, e-mail, company
 */
export function isCommonPassword(password: string, known: readonly string[] = []): boolean {
  const plain = password.toLowerCase().normalize("NFKC");
  const letters = plain.replaceAll(/[013457@$!]/g, (sign) => LEETSPEAK[sign] ?? sign);
  const forms = [plain, letters].flatMap((form) => [form, form.replaceAll(/^[\d\W_]+|[\d\W_]+$/g, "")]);
  const words = commonPasswords();
  const isKnown = (form: string) => words.has(form) || CONTEXT_WORDS.includes(form);
  if (forms.some((form) => isKnown(form) || isKnown(repeatedPart(form)))) return true;
  if (new Set(plain).size < 5) return true;
  const own = [...CONTEXT_WORDS, ...known.flatMap((text) => text.toLowerCase().split(/[^\p{L}\d]+/u))];
  const rest = own
    .filter((word) => word.length >= 4)
    .reduce((left, word) => left.replaceAll(word, ""), plain)
    .replaceAll(/[\d\W_]+/g, "");
  return rest.length < 4 && rest.length < plain.length;
}

/** The part of which a text is a repetition, or the text itself. */
function repeatedPart(text: string): string {
  return /^(.+?)\1+$/.exec(text)?.[1] ?? text;
}
