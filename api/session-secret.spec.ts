import { mkdtempSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { sessionSecret } from './session-secret';

describe('session secret', () => {
  let dataDir: string;

  beforeEach(() => {
    dataDir = mkdtempSync(join(tmpdir(), 'leafwright-secret-'));
  });

  afterEach(() => {
    rmSync(dataDir, { recursive: true, force: true });
  });

  it('is the one given', () => {
    expect(sessionSecret({ dataDir, sessionSecret: 'given' })).toBe('given');
  });

  it('is made once, for its owner only', () => {
    const made = sessionSecret({ dataDir, sessionSecret: null });
    expect(made.length).toBeGreaterThanOrEqual(64);
    expect(sessionSecret({ dataDir, sessionSecret: null })).toBe(made);
    expect(statSync(join(dataDir, 'session-secret')).mode & 0o777).toBe(0o600);
  });

  it('is refused when the file was cut short', () => {
    writeFileSync(join(dataDir, 'session-secret'), 'short');
    expect(() => sessionSecret({ dataDir, sessionSecret: null })).toThrowError(/too short/);
  });
});
