const PATTERN = /^(\d{4})-(\d{1,2})-(\d{1,2})(?:[ T]+(\d{1,2}):(\d{2}))?$/;

/** The start of a flood as it is typed, `2026-11-14 06:00`; stored as that moment in UTC, so that it reads back the same. */
export function clockFromText(text: string): { iso: string | null; fault: string | null } {
  const trimmed = text.trim();
  if (trimmed === '') return { iso: null, fault: null };
  const found = PATTERN.exec(trimmed);
  if (!found) return wrong;
  const [year, month, day, hour, minute] = found.slice(1).map((part) => Number(part ?? 0));
  const at = new Date(Date.UTC(year, month - 1, day, hour, minute));
  // The calendar of Date rolls over: 31 June would become 1 July.
  const stands =
    at.getUTCMonth() === month - 1 && at.getUTCDate() === day && hour < 24 && minute < 60;
  return stands ? { iso: at.toISOString(), fault: null } : wrong;
}

const wrong = {
  iso: null,
  fault: 'Write a day and a time, like 2026-11-14 06:00, or leave it empty.',
};

export const clockToText = (iso: string | null): string =>
  iso === null ? '' : new Date(iso).toISOString().slice(0, 16).replace('T', ' ');
