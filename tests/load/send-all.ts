import { Agent, request } from "node:http";

/** One request to send: where, what, and with which cookie. */
export interface Shot {
  url: string;
  body: string;
  cookie?: string;
  origin?: string;
  /** Throws when the answer is not what it has to be. */
  check: (status: number, text: string) => void;
}

/**
 * Sends lists of requests side by side, each list in its order over a connection of its own that stays open.
 * @returns milliseconds from the first request to the last answer
 */
export async function sendAll(lists: readonly (readonly Shot[])[]): Promise<number> {
  const agents = lists.map(() => new Agent({ keepAlive: true, maxSockets: 1 }));
  const begin = performance.now();
  await Promise.all(
    lists.map(async (list, index) => {
      for (const shot of list) await send(shot, agents[index]);
    }),
  );
  const took = performance.now() - begin;
  for (const agent of agents) agent.destroy();
  return took;
}

async function send({ url, body, cookie, origin, check }: Shot, agent: Agent | undefined): Promise<void> {
  await new Promise<void>((resolve, reject) => {
    const sent = request(
      url,
      {
        agent,
        method: "POST",
        headers: {
          "content-type": "application/json",
          "content-length": Buffer.byteLength(body),
          ...(cookie ? { cookie } : {}),
          ...(origin ? { origin } : {}),
        },
      },
      (response) => {
        const chunks: Buffer[] = [];
        response.on("data", (chunk: Buffer) => chunks.push(chunk));
        response.once("error", reject);
        response.once("end", () => {
          try {
            check(response.statusCode ?? 0, Buffer.concat(chunks).toString());
            resolve();
          } catch (error) {
            reject(error);
          }
        });
      },
    );
    sent.once("error", reject);
    sent.end(body);
  });
}
