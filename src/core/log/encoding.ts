/**
 * How a log spells its letters. Figures and stamps are ASCII in all encodings that are read; UTF-16 is turned into
 * UTF-8 on its way in, so that the reader meets bytes of one kind.
 */

export type Encoding = 'utf-8' | 'utf-16le' | 'utf-16be' | 'windows-1252';

export interface Spelling {
  readonly encoding: Encoding;
  /** Bytes of the byte order mark at the start. */
  readonly mark: 0 | 2 | 3;
}

/** The encoding of a log by its mark; without one by where its NUL bytes stand, and by whether it is valid UTF-8. */
export function spellingOf(bytes: Uint8Array): Spelling {
  if (bytes[0] === 0xef && bytes[1] === 0xbb && bytes[2] === 0xbf) return { encoding: 'utf-8', mark: 3 };
  if (bytes[0] === 0xff && bytes[1] === 0xfe) return { encoding: 'utf-16le', mark: 2 };
  if (bytes[0] === 0xfe && bytes[1] === 0xff) return { encoding: 'utf-16be', mark: 2 };
  const [even, odd] = nulShares(bytes);
  if (odd > 0.4 && even < 0.1) return { encoding: 'utf-16le', mark: 0 };
  if (even > 0.4 && odd < 0.1) return { encoding: 'utf-16be', mark: 0 };
  return { encoding: isUtf8(bytes) ? 'utf-8' : 'windows-1252', mark: 0 };
}

/** Shares of NUL at even and odd places, of the first 4096 bytes. */
function nulShares(bytes: Uint8Array): readonly [even: number, odd: number] {
  const length = Math.min(bytes.length, 4096) & ~1;
  const found: [number, number] = [0, 0];
  for (let at = 0; at < length; at += 1) if (bytes[at] === 0) found[(at & 1) as 0 | 1] += 1;
  return length === 0 ? [0, 0] : [(2 * found[0]) / length, (2 * found[1]) / length];
}

/** Bytes of the character that begins with a byte; 0 when none does. */
const lengthOf = (first: number): number =>
  first < 0x80 ? 1 : first < 0xc2 ? 0 : first < 0xe0 ? 2 : first < 0xf0 ? 3 : first < 0xf5 ? 4 : 0;

/** Code point at a place; -1 when the bytes there are no character. */
function codeAt(bytes: Uint8Array, at: number, length: number): number {
  if (length === 0 || at + length > bytes.length) return -1;
  const first = bytes[at] ?? 0;
  let code = length === 1 ? first : first & (0x7f >> length);
  for (let next = 1; next < length; next += 1) {
    const byte = bytes[at + next] ?? 0;
    if ((byte & 0xc0) !== 0x80) return -1;
    code = (code << 6) | (byte & 0x3f);
  }
  const least = [0, 0, 0x80, 0x800, 0x10000][length] ?? 0;
  return code < least || code > 0x10ffff || (code >= 0xd800 && code < 0xe000) ? -1 : code;
}

/** Whether bytes are UTF-8; a character that is cut off at the end is none of their fault. */
function isUtf8(bytes: Uint8Array): boolean {
  let at = 0;
  while (at < bytes.length) {
    const length = lengthOf(bytes[at] ?? 0);
    if (length > 1 && at + length > bytes.length) return true;
    if (codeAt(bytes, at, length) < 0) return false;
    at += length;
  }
  return true;
}

/** Code points of 0x80 to 0x9f in windows-1252; where it leaves a place free, the byte stands for itself. */
const HIGH = '€\u0081‚ƒ„…†‡ˆ‰Š‹Œ\u008dŽ\u008f\u0090‘’“”•–—˜™š›œ\u009džŸ';

/** Text of bytes that the reader holds: windows-1252, or UTF-8 with U+FFFD for what is no character. */
export function textOf(bytes: Uint8Array, encoding: Encoding): string {
  let text = '';
  for (let at = 0; at < bytes.length; ) {
    const byte = bytes[at] ?? 0;
    if (encoding === 'windows-1252') {
      text += byte >= 0x80 && byte < 0xa0 ? HIGH.charAt(byte - 0x80) : String.fromCharCode(byte);
      at += 1;
      continue;
    }
    const length = lengthOf(byte);
    const code = codeAt(bytes, at, length);
    text += code < 0 ? '\ufffd' : String.fromCodePoint(code);
    at += code < 0 ? 1 : length;
  }
  return text;
}

/** UTF-16 on its way to UTF-8: what is kept from one piece to the next. */
export interface Transcoder {
  readonly little: boolean;
  byte: number; // the first byte of a unit that was cut, or -1
  high: number; // the first half of a pair, or 0
}

export const openTranscoder = (encoding: Encoding): Transcoder => ({
  little: encoding === 'utf-16le',
  byte: -1,
  high: 0,
});

const LOST = 0xfffd;

/** UTF-8 of a piece of UTF-16 of any length, odd ones too. */
export function toUtf8(transcoder: Transcoder, piece: Uint8Array): Uint8Array {
  const out = new Uint8Array(piece.length * 2 + 8);
  let size = 0;
  for (const byte of piece) {
    if (transcoder.byte < 0) {
      transcoder.byte = byte;
      continue;
    }
    const unit = transcoder.little ? transcoder.byte | (byte << 8) : (transcoder.byte << 8) | byte;
    transcoder.byte = -1;
    size = writeUnit(transcoder, unit, out, size);
  }
  return out.subarray(0, size);
}

function writeUnit(transcoder: Transcoder, unit: number, out: Uint8Array, size: number): number {
  const { high } = transcoder;
  const isLow = unit >= 0xdc00 && unit < 0xe000;
  transcoder.high = unit >= 0xd800 && unit < 0xdc00 ? unit : 0;
  if (high !== 0 && isLow) return writeCode(0x10000 + ((high - 0xd800) << 10) + (unit - 0xdc00), out, size);
  const after = high === 0 ? size : writeCode(LOST, out, size);
  if (transcoder.high !== 0) return after;
  return writeCode(isLow ? LOST : unit, out, after);
}

function writeCode(code: number, out: Uint8Array, size: number): number {
  const length = code < 0x80 ? 1 : code < 0x800 ? 2 : code < 0x10000 ? 3 : 4;
  if (length === 1) out[size] = code;
  else {
    for (let at = length - 1; at > 0; at -= 1) out[size + at] = 0x80 | ((code >> (6 * (length - 1 - at))) & 0x3f);
    out[size] = ((0xf00 >> length) & 0xff) | (code >> (6 * (length - 1)));
  }
  return size + length;
}
