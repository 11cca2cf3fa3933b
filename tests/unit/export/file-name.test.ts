import { describe, expect, it } from 'vitest';
import { exportFileName } from '@/lib/export/file-name';

describe('the file name of an export', () => {
  it.each([
    ['Battery hatch hook', 'stl', 'Battery-hatch-hook.stl'],
    ['Röhrenclip 6 mm (größer)', '3mf', 'Rohrenclip-6-mm-gro-er.3mf'],
    ['../../etc/passwd', 'stl', 'etc-passwd.stl'],
    ['a"b;\r\nSet-Cookie: c', 'stl', 'a-b-Set-Cookie-c.stl'],
    ['.hidden', 'stl', 'hidden.stl'],
    ['留め具', 'stl', 'part.stl'],
    ['  ', '3mf', 'part.3mf'],
    ['CON', 'stl', 'part-CON.stl'],
    ['lpt1.old', 'stl', 'part-lpt1.old.stl'],
    ['x'.repeat(300), 'stl', `${'x'.repeat(80)}.stl`],
  ] as const)('%j as %s is %s', (title, format, name) => {
    expect(exportFileName(title, format)).toBe(name);
  });
});
