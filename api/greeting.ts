/** What the terminal says when the shop is open. */
import type { Config } from './config';
import { DEMO_PASSWORD, DEMO_PEOPLE } from './demo-shop';

const LOOPBACK = ['127.0.0.1', '::1', 'localhost', '0.0.0.0', '::'];

export function greeting(config: Pick<Config, 'host' | 'shop'>, port: number): string {
  const host = LOOPBACK.includes(config.host) ? 'localhost' : config.host;
  const lines = [`Leafwright is open at http://${host}:${port}`];
  if (config.shop === 'demo') {
    const width = Math.max(...DEMO_PEOPLE.map(({ email }) => email.length));
    lines.push('This is the demo shop. Sign in as', '');
    for (const { email, roles } of DEMO_PEOPLE) lines.push(`  ${email.padEnd(width)}  ${roles.join(', ')}`);
    lines.push('', `each with the password ${DEMO_PASSWORD}`);
  }
  lines.push('Ctrl-C closes it.', '');
  return lines.join('\n');
}
