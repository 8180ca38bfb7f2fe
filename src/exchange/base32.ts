/** RFC 4648, section 6. All of it is in the alphanumeric mode of QR, and nothing of it is white space. */
const alphabet = 'ABCDEFGHIJKLMNOPQRSTUVWXYZ234567';

/** Bytes as Base32 (RFC 4648) in capitals without padding: 8 characters for 5 bytes, the last group shorter. */
export function toBase32(bytes: Uint8Array): string {
  let text = '';
  let held = 0;
  let bits = 0;
  for (const byte of bytes) {
    held = (held << 8) | byte;
    bits += 8;
    while (bits >= 5) {
      bits -= 5;
      text += alphabet.charAt((held >> bits) & 31);
    }
    held &= (1 << bits) - 1;
  }
  return bits === 0 ? text : text + alphabet.charAt((held << (5 - bits)) & 31);
}

/** The values of characters, 0 to 31; −1 for what is not in the alphabet. */
export function base32Digits(letters: string): number[] {
  return Array.from(letters, (letter) => alphabet.indexOf(letter));
}

/** The characters of values from 0 to 31. */
export function base32Of(digits: readonly number[]): string {
  return digits.map((digit) => alphabet.charAt(digit)).join('');
}

/** What somebody typed, in capitals; `0`, `1`, `8`, which are not in the alphabet, are read as O, I, B. */
export function base32Letters(typed: string): string {
  return typed.toUpperCase().replaceAll('0', 'O').replaceAll('1', 'I').replaceAll('8', 'B');
}

/**
 * Bytes of Base32 without padding; null when a character is strange, the length is none that can be, or bits are set
 * that stand for nothing. Characters are read as `base32Letters` reads them.
 */
export function fromBase32(text: string): Uint8Array | null {
  const plain = base32Letters(text);
  if (![0, 2, 4, 5, 7].includes(plain.length % 8)) return null;
  const bytes = new Uint8Array(Math.floor((plain.length * 5) / 8));
  let held = 0;
  let bits = 0;
  let at = 0;
  for (const character of plain) {
    const value = alphabet.indexOf(character);
    if (value < 0) return null;
    held = (held << 5) | value;
    bits += 5;
    if (bits >= 8) {
      bits -= 8;
      bytes[at++] = (held >> bits) & 255;
      held &= (1 << bits) - 1;
    }
  }
  return held === 0 ? bytes : null;
}
