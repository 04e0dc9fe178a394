import { connect, createServer } from 'node:net';
import type { AddressInfo, Socket } from 'node:net';

export interface CutLine {
  /** The given address, through the line. */
  url: string;
  /** Ends every connection and takes no new one. */
  cut(): void;
  mend(): void;
  close(): Promise<void>;
}

/** A line to the database that a test can cut and mend, so that the suite's own cluster is left in peace. */
export async function makeCutLine(databaseUrl: string): Promise<CutLine> {
  const target = new URL(databaseUrl);
  const sockets = new Set<Socket>();
  let whole = true;
  const server = createServer((near) => {
    if (!whole) return near.destroy();
    const far = connect(Number(target.port), target.hostname);
    for (const [one, other] of [
      [near, far],
      [far, near],
    ] as const) {
      sockets.add(one);
      one.on('error', () => other.destroy());
      one.on('close', () => {
        sockets.delete(one);
        other.destroy();
      });
      one.pipe(other);
    }
    return undefined;
  });
  await new Promise<void>((done) => server.listen(0, '127.0.0.1', done));
  const url = new URL(databaseUrl);
  url.port = String((server.address() as AddressInfo).port);
  const cut = () => {
    whole = false;
    for (const socket of sockets) socket.destroy();
  };
  return {
    url: url.href,
    cut,
    mend: () => {
      whole = true;
    },
    close: async () => {
      cut();
      await new Promise((done) => server.close(done));
    },
  };
}
