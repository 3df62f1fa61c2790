import { once } from 'node:events';
import { createServer, type AddressInfo } from 'node:net';
import { describe, expect, it } from 'vitest';
import { asListenFailure } from '#server/setup/listen-failure';
import { describeFailure } from '#server/setup/setup-failure';

/** What the system says when somebody listens there. */
async function failureOf(host: string, port: number): Promise<string> {
  const server = createServer();
  const failed = once(server, 'error') as Promise<[Error]>;
  server.listen(port, host);
  const [error] = await failed;
  return describeFailure(asListenFailure(error, { host, port }));
}

describe('an address that cannot be had', () => {
  it('says that another program has the port', async () => {
    const other = createServer().listen(0, '127.0.0.1');
    await once(other, 'listening');
    const { port } = other.address() as AddressInfo;
    expect(await failureOf('127.0.0.1', port)).toMatch(new RegExp(`^Port ${port} .*taken.*\n.*another port: PORT=\\d+`));
    other.close();
  });

  it('says that the machine has no such address', async () => {
    // TEST-NET-1 of RFC 5737, which no machine has.
    expect(await failureOf('192.0.2.1', 0)).toMatch(/^This machine has no address 192\.0\.2\.1\.\n.*HOST/);
  });

  it('says that the account may not have the port', () => {
    const error = Object.assign(new Error('listen EACCES'), { code: 'EACCES' });
    expect(describeFailure(asListenFailure(error, { host: '127.0.0.1', port: 80 }))).toMatch(/port 80\.\n.*1024/);
  });

  it('leaves a bug as it is', () => {
    const bug = new TypeError('x is not a function');
    expect(asListenFailure(bug, { host: '127.0.0.1', port: 3000 })).toBe(bug);
  });
});
