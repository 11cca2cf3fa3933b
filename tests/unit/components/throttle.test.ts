import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { throttle } from '@/components/studio/throttle';

describe('a throttled call', () => {
  beforeEach(() => void vi.useFakeTimers());
  afterEach(() => void vi.useRealTimers());

  it('is made at once, then no more often than asked, the last one never lost', () => {
    const work = vi.fn();
    const { call } = throttle(work, 100);
    for (let n = 0; n < 10; n += 1) {
      call();
      vi.advanceTimersByTime(30);
    }
    expect(work).toHaveBeenCalledTimes(4);
    vi.advanceTimersByTime(500);
    expect(work).toHaveBeenCalledTimes(4);
  });

  it('is made early when flushed, and not at all when cancelled', () => {
    const work = vi.fn();
    const { call, flush, cancel } = throttle(work, 100);
    call();
    call();
    flush();
    expect(work).toHaveBeenCalledTimes(2);
    call();
    cancel();
    vi.advanceTimersByTime(500);
    expect(work).toHaveBeenCalledTimes(2);
  });
});
