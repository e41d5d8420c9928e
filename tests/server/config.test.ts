import { describe, expect, it } from 'vitest';
import type { ConfigError} from '#server/config.ts';
import { readConfig } from '#server/config.ts';

const problemsOf = (environment: Record<string, string>, demo = false): readonly string[] => {
  try {
    readConfig(environment, { demo });
    return [];
  } catch (error) {
    return (error as ConfigError).problems;
  }
};

describe('readConfig', () => {
  it('refuses a production start without its secret and says which', () => {
    expect(problemsOf({})).toEqual([expect.stringContaining('DEXTRAL_SESSION_SECRET must be set')]);
    expect(problemsOf({ DEXTRAL_SESSION_SECRET: 'short' })).toHaveLength(1);
  });
  it('names every problem at once', () => {
    expect(problemsOf({ PORT: 'x', DEXTRAL_PUBLIC_URL: 'ftp://a', DEXTRAL_ADMIN_PASSWORD: 'short' })).toHaveLength(4);
  });
  it('needs nothing in the demo and makes a secret of its own', () => {
    const [a, b] = [readConfig({}, { demo: true }), readConfig({}, { demo: true })];
    expect(a.sessionSecret.equals(b.sessionSecret)).toBe(false);
    expect(a.port).toBe(8787);
  });
});
