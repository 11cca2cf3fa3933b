import { execFileSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';

const FIXES = [
  'Edges fixed',
  'Facets removed',
  'Facets added',
  'Facets reversed',
  'Backwards edges',
  'Degenerate facets',
  'Total disconnected facets',
] as const;

export interface AdmeshReport {
  readonly facets: number;
  readonly parts: number;
  readonly volume: number;
  /** least x, y, z */
  readonly least: readonly [number, number, number];
  /** everything it had to mend, by its own words; empty for a sound file */
  readonly mended: Readonly<Record<string, number>>;
}

/** What Debian's admesh finds in a binary STL file. */
export function admesh(bytes: Uint8Array): AdmeshReport {
  const folder = mkdtempSync(path.join(tmpdir(), 'admesh-'));
  try {
    const file = path.join(folder, 'part.stl');
    writeFileSync(file, bytes);
    const report = execFileSync('admesh', [file], { encoding: 'utf8' });
    const numberAfter = (label: string) => {
      const found = new RegExp(`${label}\\s*:\\s*(-?[\\d.]+)`).exec(report);
      if (!found) throw new Error(`admesh reports no "${label}":\n${report}`);
      return Number(found[1]);
    };
    const leastOf = (axis: string) => Number(new RegExp(`Min ${axis}\\s*=\\s*(-?[\\d.]+)`).exec(report)?.[1]);
    const mended = FIXES.map((label) => [label, numberAfter(label)] as const).filter(([, n]) => n !== 0);
    return {
      facets: numberAfter('Number of facets'),
      parts: numberAfter('Number of parts'),
      volume: numberAfter('Volume'),
      least: [leastOf('X'), leastOf('Y'), leastOf('Z')],
      mended: Object.fromEntries(mended),
    };
  } finally {
    rmSync(folder, { recursive: true });
  }
}
