import type { RequestListener } from "node:http";

/** Whether the service takes new requests; a load balancer asks /readyz. */
export interface Readiness {
  ready: boolean;
}

/**
 * What runs the service asks here, on a listener of its own: alive means that the event loop turns, ready that new
 * requests are welcome.
 */
export function operations(readiness: Readiness): RequestListener {
  return (request, response) => {
    const [status, state] = stateAt(request.url ?? "", readiness);
    const allowed = request.method === "GET" || request.method === "HEAD";
    const body = JSON.stringify({ status: allowed ? state : "method not allowed" });
    response.writeHead(allowed ? status : 405, {
      "Content-Type": "application/json",
      "Content-Length": Buffer.byteLength(body),
      "Cache-Control": "no-store",
      ...(allowed ? null : { Allow: "GET, HEAD" }),
    });
    response.end(body);
  };
}

function stateAt(path: string, { ready }: Readiness): [status: number, state: string] {
  switch (path) {
    case "/livez":
      return [200, "alive"];
    case "/readyz":
      return ready ? [200, "ready"] : [503, "draining"];
    default:
      return [404, "not found"];
  }
}
