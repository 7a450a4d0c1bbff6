import jsQR from 'jsqr';
import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { QrCode } from '../../../../src/account/qr-code.tsx';

/** Draws the picture's own path, four dots a square, as a camera would see it. */
function pixelsOf(markup: string): { data: Uint8ClampedArray; width: number } {
  const side = Number(/viewBox="-4 -4 (\d+) /.exec(markup)?.[1]);
  const scale = 4;
  const width = side * scale;
  const data = new Uint8ClampedArray(width * width * 4).fill(255);
  for (const [, x = '', y = ''] of markup.matchAll(/M(\d+) (\d+)h1v1h-1z/g)) {
    for (let row = 0; row < scale; row += 1) {
      for (let column = 0; column < scale; column += 1) {
        const at = (((Number(y) + 4) * scale + row) * width + (Number(x) + 4) * scale + column) * 4;
        data.fill(0, at, at + 3);
      }
    }
  }
  return { data, width };
}

describe('the key as a square code', () => {
  // Read back by a decoder of its own making (jsqr), which shares nothing with what draws it.
  it.each([
    'otpauth://totp/Leeway:ines%40example.org?secret=JBSWY3DPEHPK3PXPJBSWY3DPEHPK3PXP&issuer=Leeway&digits=6&period=30',
    `otpauth://totp/Leeway:${'a'.repeat(200)}%40example.org?secret=${'JBSWY3DP'.repeat(8)}&issuer=Leeway`,
    'x',
  ])('is read back by a camera as it was: %#', (text) => {
    const { data, width } = pixelsOf(renderToStaticMarkup(<QrCode text={text} label="The key" />));
    expect(jsQR(data, width, width)?.data).toBe(text);
  });

  it('has a name for those who do not see it', () => {
    expect(renderToStaticMarkup(<QrCode text="x" label="The key" />)).toContain('aria-label="The key"');
  });
});
