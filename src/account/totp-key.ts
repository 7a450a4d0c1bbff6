/** The key inside an `otpauth:` address, in groups of four to be typed; null where there is none. */
export function keyToType(totpURI: string): string | null {
  const secret = URL.canParse(totpURI) ? new URL(totpURI).searchParams.get('secret') : null;
  return secret === null || secret === '' ? null : (secret.match(/.{1,4}/g) ?? []).join(' ');
}
