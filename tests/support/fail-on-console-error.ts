import { afterEach, beforeEach, expect, vi } from 'vitest';

let spy: ReturnType<typeof vi.spyOn>;

beforeEach(() => {
  spy = vi.spyOn(console, 'error');
});

afterEach(() => {
  const calls = spy.mock.calls.slice();
  spy.mockRestore();
  expect(calls, 'a test must not leave a console.error behind').toEqual([]);
});
