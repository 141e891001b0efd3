import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { request } from "node:http";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { createStaticServer, type StaticServer } from "../../scripts/static-server.mjs";

let place: string;
let server: StaticServer;

beforeEach(async () => {
  place = mkdtempSync(join(tmpdir(), "fadewright-server-"));
  mkdirSync(join(place, "site/part"), { recursive: true });
  mkdirSync(join(place, "site-beside"));
  writeFileSync(join(place, "secret.txt"), "secret");
  writeFileSync(join(place, "site-beside/secret.txt"), "secret");
  writeFileSync(join(place, "site/index.html"), "start");
  writeFileSync(join(place, "site/part/index.html"), "part");
  writeFileSync(join(place, "site/sw.js"), "worker");
  writeFileSync(join(place, "site/app.webmanifest"), "{}");
  server = createStaticServer(join(place, "site"));
  await server.start(0);
});
afterEach(async () => {
  await server.stop();
  rmSync(place, { recursive: true });
});

/** As it is sent: fetch would tidy the path first. */
const statusOf = (path: string, method = "GET") =>
  new Promise<number | undefined>((resolve, reject) => {
    const { hostname, port } = new URL(server.url);
    request({ hostname, port, path, method }, (response) => {
      response.resume();
      resolve(response.statusCode);
    })
      .on("error", reject)
      .end();
  });

describe("the static server", () => {
  it.each([
    ["/", "start", "text/html; charset=utf-8"],
    ["/?from=icon", "start", "text/html; charset=utf-8"],
    ["/part/", "part", "text/html; charset=utf-8"],
    ["/part", "part", "text/html; charset=utf-8"],
    ["/sw.js", "worker", "text/javascript; charset=utf-8"],
    ["/app.webmanifest", "{}", "application/manifest+json; charset=utf-8"],
  ])("answers %s with the file and its type, to be asked for again", async (path, text, type) => {
    const response = await fetch(server.url + path);
    expect(await response.text()).toBe(text);
    expect(response.headers.get("content-type")).toBe(type);
    expect(response.headers.get("cache-control")).toBe("no-cache");
  });

  it.each(["/missing.js", "/missing", "/sw.js/", "/part/missing/"])(
    "has no start page to give for %s",
    async (path) => expect(await statusOf(path)).toBe(404),
  );

  it.each([
    "/../secret.txt",
    "/part/../../secret.txt",
    "/%2e%2e/secret.txt",
    "/..%2fsecret.txt",
    "/..%2fsite-beside/secret.txt",
    "/%00",
    "/%",
    "//",
  ])("gives out nothing but files of its folder for %s", async (path) => {
    expect([200, 404]).toContain(await statusOf(path));
    const response = await fetch(server.url + path);
    expect(await response.text()).not.toContain("secret");
  });

  it("takes no writing", async () => {
    expect(await statusOf("/", "POST")).toBe(405);
    expect(await statusOf("/", "HEAD")).toBe(200);
  });

  it("notes what was asked for, and stops for good although connections are open", async () => {
    await fetch(`${server.url}/sw.js`);
    expect(server.requests).toEqual(["/sw.js"]);
    const { url } = server;
    await server.stop();
    await expect(fetch(url)).rejects.toThrow();
    await server.start(Number(new URL(url).port));
    expect(server.url).toBe(url);
    expect((await fetch(url)).status).toBe(200);
  });

  it("stops although an answer is still under way", async () => {
    await server.stop();
    let isAsked = (): void => {};
    const asked = new Promise<void>((resolve) => {
      isAsked = resolve;
    });
    server = createStaticServer(join(place, "site"), () => {
      isAsked();
      return new Promise(() => {});
    });
    await server.start(0);
    const answer = expect(fetch(server.url)).rejects.toThrow();
    await asked;
    await server.stop();
    await answer;
  });

  it("lets whoever asked to answer in its place do so", async () => {
    await server.stop();
    server = createStaticServer(join(place, "site"), (path, response) => {
      if (path === "/sw.js") response.writeHead(503).end();
      return path === "/sw.js";
    });
    await server.start(0);
    expect(await statusOf("/sw.js")).toBe(503);
    expect(await statusOf("/")).toBe(200);
  });
});
