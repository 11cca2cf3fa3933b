import { describe, expect, it } from 'vitest';
import { readEnv } from '@/lib/env';

describe('the environment', () => {
  it('runs with nothing set', () => {
    expect(readEnv({})).toMatchObject({
      HOSTNAME: '127.0.0.1',
      PORT: 3000,
      DATABASE_PATH: './data/bendwell.sqlite',
    });
  });

  it('counts an empty variable as not set', () => {
    expect(readEnv({ PORT: '', DATABASE_PATH: '' }).PORT).toBe(3000);
  });

  it('names every variable that cannot be used in one message', () => {
    const bad = { PORT: '70000', NODE_ENV: 'staging', RATE_CHECKS_PER_MINUTE: 'many', LOG_LEVEL: 'loud' };
    expect(() => readEnv(bad)).toThrow(
      /PORT must be at most 65535[\s\S]*|NODE_ENV must be development, production or test/,
    );
    try {
      readEnv(bad);
    } catch (error) {
      for (const name of Object.keys(bad)) expect((error as Error).message).toContain(name);
    }
  });
});
