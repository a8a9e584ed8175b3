/** A program of the server as a process of its own: what it says and how it ends. */
import { type ChildProcess, spawn } from 'node:child_process';
import { once } from 'node:events';
import { PACKAGE_ROOT } from '../../api/package-root';

export class Programs {
  readonly #running: ChildProcess[] = [];

  start(
    file: string,
    args: readonly string[],
    env: Record<string, string | undefined>,
    { input = '', asNobody = false }: { input?: string; asNobody?: boolean } = {},
  ) {
    // To the superuser nothing is forbidden; where the tests run as somebody else, that is enough of a nobody.
    const nobody = asNobody && process.getuid?.() === 0 ? { uid: 65534, gid: 65534 } : {};
    const child = spawn(process.execPath, ['--import', 'tsx', file, ...args], {
      cwd: PACKAGE_ROOT,
      env: { ...process.env, ...env },
      stdio: ['pipe', 'pipe', 'pipe'],
      ...nobody,
    });
    this.#running.push(child);
    // A program that refuses at once does not read what it is sent.
    child.stdin.on('error', () => undefined);
    child.stdin.end(input);
    const said = { text: '' };
    const opened = new Promise<string>((resolve) => {
      child.stdout.on('data', (chunk: Buffer) => {
        said.text += chunk.toString();
        const address = /http:\/\/localhost:\d+/.exec(said.text)?.[0];
        if (address !== undefined && said.text.includes('Ctrl-C')) resolve(address);
      });
    });
    child.stderr.on('data', (chunk: Buffer) => (said.text += chunk.toString()));
    return { child, said, opened, ended: once(child, 'close').then(([code]) => code as number | null) };
  }

  async stop(): Promise<void> {
    for (const child of this.#running.splice(0)) {
      if (child.exitCode === null && child.signalCode === null && child.kill('SIGKILL')) await once(child, 'exit');
    }
  }
}
