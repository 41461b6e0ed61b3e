import type { Server } from "node:http";
import type { AddressInfo } from "node:net";

/** Load balancers commonly reuse a connection for 60 s: closing it first would cost them a request now and then. */
const KEEP_ALIVE_MS = 65_000;
const HEADERS_MS = KEEP_ALIVE_MS + 1_000;

/** Starts to listen; answers the address as a URL. */
export function listen(server: Server, host: string, port: number): Promise<string> {
  server.keepAliveTimeout = KEEP_ALIVE_MS;
  server.headersTimeout = HEADERS_MS;
  return new Promise((resolve, reject) => {
    server.once("error", reject);
    server.listen(port, host, () => {
      const { address, family, port: bound } = server.address() as AddressInfo;
      resolve(`http://${family === "IPv6" ? `[${address}]` : address}:${bound}`);
    });
  });
}

/**
 * Stops accepting and waits for what is in flight, but not longer than `deadline_s`; answers whether everything was
 * finished in time.
 */
export async function drain(server: Server, deadline_s: number): Promise<boolean> {
  let inTime = true;
  // A connection that falls idle after close() was called would keep the server open until its keep-alive ends.
  const sweep = setInterval(() => server.closeIdleConnections(), 50);
  const deadline = setTimeout(() => {
    inTime = false;
    server.closeAllConnections();
  }, deadline_s * 1e3);
  await new Promise<void>((resolve) => server.close(() => resolve()));
  clearInterval(sweep);
  clearTimeout(deadline);
  return inTime;
}
