/** The week of the scenario tables begins on Monday, 8 June 2026, in UTC. */
const MONDAY_MS = Date.parse("2026-06-08T00:00:00Z");
const days = ["Mon", "Tue", "Wed", "Thu", "Fri", "Sat", "Sun"];
const TIME = /^(\d{2}):(\d{2})(?::(\d{2})(?:\.(\d{3}))?)?$/;

/** Takes a time off the front of a row, "08:00", "08:00:05.250" or "Tue 06:00"; epoch ms, or null. */
export function takeTime(words: string[]): number | null {
  const day = days.indexOf(words[0] ?? "");
  const match = TIME.exec(words[day < 0 ? 0 : 1] ?? "");
  if (!match) return null;
  words.splice(0, day < 0 ? 1 : 2);
  const [hour = 0, minute = 0, second = 0, ms = 0] = match
    .slice(1)
    .map((part) => Number(part ?? 0));
  const dayMs = Math.max(day, 0) * 86_400_000;
  return MONDAY_MS + dayMs + ((hour * 60 + minute) * 60 + second) * 1000 + ms;
}

/** Writes epoch seconds as a row has them: the day only after Monday, the seconds only if any. */
export function timeText(seconds: number): string {
  const past = seconds - MONDAY_MS / 1000;
  const day = Math.floor(past / 86_400);
  const [time] = new Date(seconds * 1000).toISOString().slice(11).split(".");
  const shown = time!.endsWith(":00") ? time!.slice(0, 5) : time!;
  return day === 0 ? shown : `${days[day]} ${shown}`;
}
