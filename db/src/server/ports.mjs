import net from "node:net";

/**
 * Tells whether a port on the loopback address can be listened on.
 *
 * @param {number} port
 * @returns {Promise<boolean>}
 */
export async function isPortFree(port) {
  return new Promise((resolve) => {
    const probe = net.createServer();
    probe.once("error", () => resolve(false));
    probe.listen({ host: "127.0.0.1", port, exclusive: true }, () => probe.close(() => resolve(true)));
  });
}

/**
 * Asks the system for a port nobody uses at this moment on the loopback address.
 *
 * @returns {Promise<number>}
 */
export async function findFreePort() {
  return new Promise((resolve, reject) => {
    const probe = net.createServer();
    probe.once("error", reject);
    probe.listen({ host: "127.0.0.1", port: 0 }, () => {
      const address = probe.address();
      const port = typeof address === "object" && address !== null ? address.port : 0;
      probe.close(() => resolve(port));
    });
  });
}
