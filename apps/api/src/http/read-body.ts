import { MAX_BODY_BYTES, MAX_BODY_DEPTH } from "@emberladder/contract";
import express from "express";
import type { Request, Response } from "express";
import { ApiError } from "./api-error.ts";

const FORBIDDEN_KEYS = new Set(["__proto__", "constructor", "prototype"]);
const decoder = new TextDecoder("utf-8", { fatal: true });

/**
 * Reads the JSON body of a request.
 * @param maxBytes limit after any decompression
 * @throws ApiError `wrong-content-type`, `too-large` or `malformed-body`.
 */
export async function readBody(
  request: Request,
  response: Response,
  maxBytes = MAX_BODY_BYTES,
): Promise<unknown> {
  if (!/^application\/json\s*(?:;\s*charset=utf-8\s*)?$/i.test(request.headers["content-type"] ?? ""))
    throw new ApiError("wrong-content-type");
  const raw = express.raw({ type: () => true, limit: maxBytes });
  await new Promise<void>((resolve, reject) => {
    raw(request, response, (error?: unknown) => {
      if (error === undefined || error === null) resolve();
      else reject(bodyError(error));
    });
  });
  return parseJson(request.body instanceof Uint8Array ? request.body : new Uint8Array());
}

function bodyError(error: unknown): ApiError {
  const type = (error as { type?: string }).type ?? "";
  if (type === "entity.too.large") return new ApiError("too-large");
  if (type === "encoding.unsupported" || type === "charset.unsupported")
    return new ApiError("wrong-content-type");
  return new ApiError("malformed-body", { detail: "The body did not arrive whole." });
}

/**
 * Parses JSON bytes, and refuses what could reach a prototype or overflow a stack before anything else sees it.
 * @throws ApiError `malformed-body`.
 */
export function parseJson(bytes: Uint8Array): unknown {
  let value: unknown;
  try {
    value = JSON.parse(decoder.decode(bytes));
  } catch {
    throw new ApiError("malformed-body", { detail: "The body is not JSON in UTF-8." });
  }
  refuseDangerous(value);
  return value;
}

function refuseDangerous(root: unknown): void {
  const open: { value: unknown; depth: number }[] = [{ value: root, depth: 0 }];
  for (let entry = open.pop(); entry; entry = open.pop()) {
    const { value, depth } = entry;
    if (typeof value !== "object" || value === null) continue;
    if (depth > MAX_BODY_DEPTH) throw new ApiError("malformed-body", { detail: "The body nests too deep." });
    for (const [key, child] of Object.entries(value)) {
      if (FORBIDDEN_KEYS.has(key))
        throw new ApiError("malformed-body", { detail: "The body names a key that is never used." });
      open.push({ value: child, depth: depth + 1 });
    }
  }
}
