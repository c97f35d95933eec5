import type { RequestHandler } from "express";
import helmet from "helmet";

const SELF = ["'self'"];
const NONE = ["'none'"];

/**
 * The headers that every answer carries, also errors and unknown addresses: the strict content security
 * policy, no framing, no sniffing, no referrer, and HSTS for a year where the product is served over TLS.
 */
export function securityHeaders({ isHttps }: { isHttps: boolean }): RequestHandler {
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: NONE,
        scriptSrc: SELF,
        styleSrc: SELF,
        imgSrc: ["'self'", "blob:", "data:"],
        connectSrc: SELF,
        workerSrc: SELF,
        manifestSrc: SELF,
        fontSrc: SELF,
        formAction: SELF,
        frameAncestors: NONE,
        baseUri: NONE,
        objectSrc: NONE,
      },
    },
    crossOriginOpenerPolicy: { policy: "same-origin" },
    crossOriginResourcePolicy: { policy: "same-origin" },
    referrerPolicy: { policy: "no-referrer" },
    strictTransportSecurity: isHttps ? { maxAge: 31_536_000, includeSubDomains: true } : false,
    xFrameOptions: { action: "deny" },
    xPoweredBy: true,
  });
}
