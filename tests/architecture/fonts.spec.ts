import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { ROOT } from './source-files';

describe('the faces that the app serves', () => {
  it('are those of the package in the lock file, byte for byte', () => {
    const served = readdirSync(join(ROOT, 'public-fonts')).filter((name) => name.endsWith('.woff2'));
    expect(served.length).toBeGreaterThan(0);
    for (const name of served) {
      const packaged = join(ROOT, 'node_modules', '@fontsource', 'ibm-plex-sans', 'files', name);
      expect(readFileSync(join(ROOT, 'public-fonts', name)).equals(readFileSync(packaged)))
        .withContext(name)
        .toBeTrue();
    }
  });
});
