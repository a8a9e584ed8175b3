/** Finds the Chromium that component specs and journeys run in; on Debian as root it installs the package. */
import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';
import { delimiter, join } from 'node:path';

const NAMES = ['chromium', 'chromium-browser', 'google-chrome-stable', 'google-chrome'];

/** @returns {string} path of the browser; ends the process with instructions when there is none */
export function findChromium() {
  const given = process.env.CHROME_BIN;
  if (given) {
    if (existsSync(given)) return given;
    stop(`CHROME_BIN is ${given}, but no file is there.`);
  }
  const found = onPath();
  if (found) return found;
  if (existsSync('/etc/debian_version') && process.getuid?.() === 0) {
    console.log('Chromium is not here: installing the Debian package.');
    run('apt-get', ['update', '-qq']);
    run('apt-get', ['install', '-y', '-qq', '--no-install-recommends', 'chromium']);
    const installed = onPath();
    if (installed) return installed;
  }
  return stop(
    'Chromium is not on this machine. Install it (on Debian and Ubuntu: apt-get install chromium), or set CHROME_BIN to it.',
  );
}

function onPath() {
  const folders = (process.env.PATH ?? '').split(delimiter);
  return NAMES.flatMap((name) => folders.map((folder) => join(folder, name))).find((file) => existsSync(file));
}

function run(command, args) {
  spawnSync(command, args, {
    stdio: ['ignore', 'ignore', 'inherit'],
    env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' },
  });
}

function stop(message) {
  console.error(message);
  process.exit(1);
}
