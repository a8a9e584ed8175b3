/** A journey waits for a browser and a server; what it waits for is always a thing on the page, never a time. */
jasmine.DEFAULT_TIMEOUT_INTERVAL = 120_000;
