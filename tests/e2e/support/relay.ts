import { createServer, connect, type AddressInfo, type Socket } from 'node:net';

/** A wire between two programs that a test can cut: what is under way is lost, as when a plug is pulled. */
export async function startRelay(targetPort: number, port = 0) {
  let target = targetPort;
  let isCut = false;
  const open = new Set<Socket>();
  const server = createServer((near) => {
    if (isCut) {
      near.destroy();
      return;
    }
    const far = connect(target, '127.0.0.1');
    for (const socket of [near, far]) {
      open.add(socket);
      socket.on('error', () => socket.destroy());
      socket.on('close', () => {
        open.delete(socket);
        near.destroy();
        far.destroy();
      });
    }
    near.pipe(far).pipe(near);
  });
  await new Promise<void>((resolve) => server.listen(port, '127.0.0.1', resolve));
  return {
    port: (server.address() as AddressInfo).port,
    /** Where it leads from now on. */
    leadTo(next: number) {
      target = next;
    },
    cut() {
      isCut = true;
      open.forEach((socket) => socket.destroy());
    },
    mend() {
      isCut = false;
    },
    close() {
      isCut = true;
      open.forEach((socket) => socket.destroy());
      return new Promise<void>((resolve) => server.close(() => resolve()));
    },
  };
}

export type Relay = Awaited<ReturnType<typeof startRelay>>;
