/** A password from the terminal, unseen; or the first line of standard input where it is piped. */
import { createInterface } from 'node:readline';

const ENTER = /[\r\n]/;
const CTRL_C = '\u0003';
const CTRL_D = '\u0004';
const ERASE = /[\b\u007f]/;

async function firstLine(): Promise<string> {
  for await (const line of createInterface({ input: process.stdin })) return line;
  return '';
}

function unseen(question: string): Promise<string> {
  return new Promise((resolve, reject) => {
    const { stdin, stderr } = process;
    let typed: string[] = [];
    const end = (): void => {
      stdin.setRawMode(false);
      stdin.pause();
      stdin.off('data', take);
      stderr.write('\n');
    };
    const take = (chunk: string): void => {
      for (const key of chunk) {
        if (key === CTRL_C) {
          end();
          reject(new Error('Nothing was changed.'));
          return;
        }
        if (ENTER.test(key) || key === CTRL_D) {
          end();
          resolve(typed.join(''));
          return;
        }
        if (ERASE.test(key)) typed = typed.slice(0, -1);
        else typed.push(key);
      }
    };
    stderr.write(question);
    stdin.setEncoding('utf8');
    stdin.setRawMode(true);
    stdin.on('data', take);
    stdin.resume();
  });
}

/** @returns the password; typed twice at a terminal, since nobody sees it */
export async function askPassword(): Promise<string> {
  if (!process.stdin.isTTY) return firstLine();
  const password = await unseen('Password: ');
  if ((await unseen('Once more: ')) !== password) throw new Error('The two were not the same. Nothing was changed.');
  return password;
}
