import type { Page } from "@playwright/test";

/** Everything the browser keeps for the product: its databases, both storages and its caches, as text by place. */
export async function readPhone(page: Page): Promise<Record<string, string>> {
  return page.evaluate(async () => {
    const kept: Record<string, string> = {
      localStorage: JSON.stringify(Object.entries(localStorage)),
      sessionStorage: JSON.stringify(Object.entries(sessionStorage)),
    };
    for (const { name = "" } of await indexedDB.databases()) {
      const database = await new Promise<IDBDatabase>((resolve, reject) => {
        const open = indexedDB.open(name);
        open.addEventListener("success", () => resolve(open.result));
        open.addEventListener("error", () => reject(new Error(`${name} does not open`)));
      });
      for (const store of database.objectStoreNames) {
        kept[`${name}/${store}`] = await new Promise<string>((resolve) => {
          const all = database.transaction(store).objectStore(store).getAll();
          all.addEventListener("success", () => resolve(JSON.stringify(all.result)));
        });
      }
      database.close();
    }
    for (const name of await caches.keys()) {
      const cache = await caches.open(name);
      for (const request of await cache.keys())
        kept[`cache ${name} ${request.url}`] = (await (await cache.match(request))?.text()) ?? "";
    }
    return kept;
  });
}
