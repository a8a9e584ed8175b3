import type { Browser } from 'playwright-core';
import { launch } from './browser';
import { openShop, type Shop } from './shop';

/** A shop of its own and a browser, for as long as one journey lasts. */
export interface Journey {
  readonly shop: Shop;
  readonly browser: Browser;
}

/** Opens both before the specs of a `describe` and closes them after; what it gives is there from the first spec on. */
export function journey(begin?: (journey: Journey) => Promise<void>): Journey {
  const open: { shop?: Shop; browser?: Browser } = {};
  const opened: Journey = {
    get shop() {
      return open.shop!;
    },
    get browser() {
      return open.browser!;
    },
  };
  beforeAll(async () => {
    open.shop = await openShop();
    open.browser = await launch();
    await begin?.(opened);
  });
  afterAll(async () => {
    await open.browser?.close();
    await open.shop?.close();
  });
  return opened;
}
