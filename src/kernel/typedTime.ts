const two = (n: number): string => String(n).padStart(2, '0');

/** A clock time as somebody typed it (`9:05`, `0905`, `9.05.30`) in the form `09:05` or `09:05:30`; null for what is none. */
export function clockTime(text: string): string | null {
  const bare = text.trim();
  const found =
    /^(\d{1,2})[:. ](\d{2})(?:[:. ](\d{2}))?$/.exec(bare) ??
    /^(\d{1,2})(\d{2})$/.exec(bare) ??
    /^(\d{2})(\d{2})(\d{2})$/.exec(bare);
  if (found === null) return null;
  const [hours, minutes] = [Number(found[1]), Number(found[2])];
  const seconds = found[3] === undefined ? null : Number(found[3]);
  if (hours > 23 || minutes > 59 || (seconds ?? 0) > 59) return null;
  return `${two(hours)}:${two(minutes)}${seconds === null ? '' : `:${two(seconds)}`}`;
}

/** Minutes and seconds as somebody typed them (`3:20`, `3.20`, `320`; `45` is seconds), in milliseconds; null for what is none. */
export function minutesAndSeconds(text: string): number | null {
  const bare = text.trim();
  const found =
    /^(\d{1,3})[:. ](\d{2})$/.exec(bare) ?? /^(\d{0,3})(\d{2})$/.exec(bare) ?? /^()(\d)$/.exec(bare);
  if (found === null) return null;
  const seconds = Number(found[2]);
  return seconds > 59 && found[1] !== '' ? null : (Number(found[1] ?? '') * 60 + seconds) * 1000;
}
