/** Characters: the least where the password is the only factor, and the most that is taken. */
export const PASSWORD_MIN = 15;
const PASSWORD_MAX = 128;
const DIFFERENT_MIN = 6;

/** Openings of the long passwords that guessers try first; matched without spaces and case. */
const COMMON = [
  "password",
  "passw0rd",
  "letmein",
  "iloveyou",
  "changeme",
  "bookmatch",
  "adminadmin",
];
const ROWS = ["12345678901234567890", "qwertyuiopasdfghjklzxcvbnm", "1q2w3e4r5t6y7u8i9o0p"];

/** Spells a password in one form (NFKC), so that it is the same from every keyboard. */
export function spelledPassword(password: string): string {
  return password.normalize("NFKC");
}

/**
 * Says what is wrong with a new password, as a sentence for its owner; null where it will do.
 * Length counts, composition does not; well-known openings, rows of keys and the person's own e-mail
 * are refused. NIST SP 800-63B-4 3.1.1.2: 15 characters where it is the only factor, each code point
 * one, no composition rules. The list of openings is common practice.
 */
export function passwordFault(password: string, email: string): string | null {
  const letters = [...spelledPassword(password)];
  const plain = letters.join("").toLowerCase().replace(/\s/g, "");
  const name = email.toLowerCase().split("@")[0]!;
  if (letters.length < PASSWORD_MIN) return `Use at least ${PASSWORD_MIN} characters: a few words.`;
  if (letters.length > PASSWORD_MAX) return `Use at most ${PASSWORD_MAX} characters.`;
  if (new Set(plain).size < DIFFERENT_MIN) return "Use more different characters.";
  if (COMMON.some((word) => plain.startsWith(word)) || ROWS.some((row) => isFrom(row, plain))) {
    return "That is one of the first that anyone would try. Use a few words of your own.";
  }
  if (name.length >= 4 && plain.startsWith(name)) return "Leave your e-mail out of it.";
  return null;
}

/** True where the text begins with twelve keys that stand in this order, forwards or backwards. */
function isFrom(row: string, text: string): boolean {
  const start = text.slice(0, 12);
  return [row, [...row].reverse().join("")].some((keys) => (keys + keys).includes(start));
}
