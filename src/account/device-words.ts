// Beginning with what names itself beside another: each browser says it is several.
const BROWSERS: readonly [RegExp, string][] = [
  [/\bEdgA?\//, 'Edge'],
  [/\bOPR\//, 'Opera'],
  [/\bSamsungBrowser\//, 'Samsung Internet'],
  [/\b(Firefox|FxiOS)\//, 'Firefox'],
  [/\b(Chrome|CriOS|HeadlessChrome|Chromium)\//, 'Chrome'],
  [/\bVersion\/[\d.]+.*\bSafari\//, 'Safari'],
  [/^curl\//, 'curl'],
];

const DEVICES: readonly [RegExp, string][] = [
  [/\biPhone\b/, 'an iPhone'],
  [/\biPad\b/, 'an iPad'],
  [/\bAndroid\b.*\bMobile\b/, 'an Android phone'],
  [/\bAndroid\b/, 'an Android tablet'],
  [/\bWindows\b/, 'Windows'],
  [/\bMacintosh\b/, 'a Mac'],
  [/\bCrOS\b/, 'a Chromebook'],
  [/\bLinux\b/, 'Linux'],
];

/** What a browser says of itself, in plain words: “Firefox on a Mac”. What says nothing known is “Some browser”. */
export function sayDevice(userAgent: string | null): string {
  const find = (list: readonly [RegExp, string][]) =>
    list.find(([pattern]) => pattern.test(userAgent ?? ''))?.[1];
  const browser = find(BROWSERS) ?? 'Some browser';
  const device = find(DEVICES);
  return device === undefined ? browser : `${browser} on ${device}`;
}
