/** The words of a page's address as Next gives them. */
export type PageWords = Readonly<Record<string, string | string[] | undefined>>;

/** Back to a query, without "?". */
export function queryOf(given: PageWords): string {
  const pairs = Object.entries(given).flatMap(([key, value]) =>
    [value ?? []].flat().map((one) => [key, one]),
  );
  return pairs.map(([key, value]) => `${encodeURIComponent(key!)}=${encodeURIComponent(value!)}`).join('&');
}
