import { readConfig, StartRefused } from './config';

describe('configuration', () => {
  it('has an answer for everything', () => {
    const config = readConfig({});
    expect([config.port, config.host, config.shop, config.logLevel]).toEqual([4300, '127.0.0.1', 'demo', 'warn']);
    expect(config.dataDir).toMatch(/[/\\]data$/);
    expect([config.shopName, config.sessionSecret, config.trustedProxies]).toEqual([null, null, 0]);
  });

  it('listens on this machine only, in a demo shop and in an own one, until told otherwise', () => {
    expect(readConfig({ SHOP: 'own' }).host).toBe('127.0.0.1');
    expect(readConfig({ SHOP: 'own', HOST: '0.0.0.0' }).host).toBe('0.0.0.0');
  });

  it('takes an empty variable for one that is not set', () => {
    expect(readConfig({ PORT: '', SHOP: '', SESSION_SECRET: '' })).toEqual(readConfig({}));
  });

  it('takes what is allowed, to the limit', () => {
    expect(readConfig({ PORT: '0' }).port).toBe(0);
    expect(readConfig({ PORT: '65535' }).port).toBe(65535);
    expect(readConfig({ SESSION_SECRET: 'x'.repeat(32) }).sessionSecret).toBe('x'.repeat(32));
    expect(readConfig({ DATA_DIR: '/srv/shop' }).dataDir).toBe('/srv/shop');
    expect(readConfig({ SHOP_NAME: 'x'.repeat(80) }).shopName).toBe('x'.repeat(80));
    for (const logLevel of ['fatal', 'error', 'warn', 'info', 'debug', 'trace', 'silent']) {
      expect(readConfig({ LOG_LEVEL: logLevel }).logLevel as string).toBe(logLevel);
    }
  });

  it('can be for a shop of one’s own until told otherwise', () => {
    expect(readConfig({}, 'own').shop).toBe('own');
    expect(readConfig({ SHOP: '' }, 'own').shop).toBe('own');
    expect(readConfig({ SHOP: 'demo' }, 'own').shop).toBe('demo');
  });

  for (const [env, words] of [
    [{ PORT: '65536' }, 'PORT must be a whole number from 0 to 65535.'],
    [{ PORT: '-1' }, 'PORT must be'],
    [{ PORT: '43x' }, 'PORT must be'],
    [{ PORT: '4300.5' }, 'PORT must be'],
    [{ SHOP: 'Demo' }, 'SHOP must be one of: demo, own.'],
    [{ LOG_LEVEL: 'loud' }, 'LOG_LEVEL must be one of'],
    [{ SESSION_SECRET: 'x'.repeat(31) }, 'SESSION_SECRET needs 32 characters'],
    [{ SHOP_NAME: 'x'.repeat(81) }, 'SHOP_NAME has 80 characters'],
    [{ SHOP_NAME: 'Vale\u202eSheet' }, 'SHOP_NAME is one line of plain text.'],
    [{ TRUST_PROXY: 'yes' }, 'TRUST_PROXY must be'],
  ] as const) {
    it(`refuses ${JSON.stringify(env).slice(0, 40)} in plain words`, () => {
      expect(() => readConfig(env)).toThrowMatching(
        (error) => error instanceof StartRefused && error.message.startsWith(words),
      );
    });
  }
});
