/** Median time in ms of a call, once warm. */
export function medianMs(call: () => unknown, { warm = 5, times = 15 } = {}): number {
  for (let at = 0; at < warm; at += 1) call();
  const taken = Array.from({ length: times }, () => {
    const start = performance.now();
    call();
    return performance.now() - start;
  });
  return taken.sort((a, b) => a - b)[Math.floor(times / 2)]!;
}

export const ms = (value: number): string => `${value.toPrecision(3)} ms`;
export const ratio = (value: number): string => `${value.toPrecision(2)} x`;

export function printTable(title: string, rows: readonly (readonly string[])[]): void {
  const widths = rows[0]!.map((_, column) => Math.max(...rows.map((row) => row[column]!.length)));
  console.log(`\n${title}`);
  for (const row of rows) {
    console.log(`  ${row.map((cell, column) => cell.padEnd(widths[column]!)).join('  ')}`);
  }
}
