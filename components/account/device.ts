const BROWSERS = [
  [/Edg\//, 'Edge'],
  [/Firefox\//, 'Firefox'],
  [/(Chrome|CriOS)\//, 'Chromium'],
  [/Safari\//, 'Safari'],
] as const;

const SYSTEMS = [
  [/Android/, 'Android'],
  [/iPhone|iPad/, 'iOS'],
  [/Windows/, 'Windows'],
  [/Mac OS X/, 'macOS'],
  [/Linux/, 'Linux'],
] as const;

const nameIn = (list: readonly (readonly [RegExp, string])[], text: string): string | undefined =>
  list.find(([pattern]) => pattern.test(text))?.[1];

/** What a sign-in was made with, as far as the browser told. */
export function deviceOf(userAgent: string): string {
  const browser = nameIn(BROWSERS, userAgent) ?? 'A browser that gives no name';
  const system = nameIn(SYSTEMS, userAgent);
  return system ? `${browser} on ${system}` : browser;
}
