import { createHmac } from 'node:crypto';

const ALPHABET = 'ABCDEFGHIJKLMNOPQRSTUVWXYZ234567';
const PERIOD_MS = 30_000;

/** The key in an `otpauth:` address, from Base32 (RFC 4648, section 6). */
export function keyOf(totpUri: string): Buffer {
  const secret = new URL(totpUri).searchParams.get('secret') ?? '';
  const bits = Array.from(secret, (letter) => ALPHABET.indexOf(letter).toString(2).padStart(5, '0')).join('');
  return Buffer.from((bits.match(/.{8}/g) ?? []).map((byte) => parseInt(byte, 2)));
}

/** What an authenticator shows: RFC 6238 with six digits, thirty seconds and SHA-1; `steps` before or after now. */
export function codeOf(totpUri: string, steps = 0, now = Date.now()): string {
  const counter = Buffer.alloc(8);
  counter.writeBigUInt64BE(BigInt(Math.floor(now / PERIOD_MS) + steps));
  const mac = createHmac('sha1', keyOf(totpUri)).update(counter).digest();
  const at = (mac.at(-1) ?? 0) & 15;
  return String((mac.readUInt32BE(at) & 0x7fffffff) % 1_000_000).padStart(6, '0');
}
