import type { Config } from '../config';
import { SetupFailure } from './setup-failure';

export const portTaken = (port: number): SetupFailure =>
  new SetupFailure(`Port ${port} of this machine is taken by another program.`, `Stop that program, or choose another port: PORT=${port + 100} npm start`);

/** Why the app cannot have its address, as something that a person can act on; any other error as it is. */
export function asListenFailure(error: unknown, { host, port }: Pick<Config, 'host' | 'port'>): unknown {
  switch (error instanceof Error && 'code' in error ? error.code : undefined) {
    case 'EADDRINUSE':
      return portTaken(port);
    case 'EACCES':
      return new SetupFailure(`This account may not listen on port ${port}.`, 'Choose a port from 1024 on, such as PORT=3000.');
    case 'EADDRNOTAVAIL':
    case 'ENOTFOUND':
      return new SetupFailure(`This machine has no address ${host}.`, 'Set HOST to an address of this machine, or leave it out.');
    default:
      return error;
  }
}
