import { cp, mkdtemp, readFile, rm, writeFile } from "node:fs/promises";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { createStaticServer, type Intercept } from "../../scripts/static-server.mjs";

/** A host of the app that a test can change and stop. */
export interface Site {
  readonly url: string;
  /** Paths asked for since the start of the test. */
  readonly requests: string[];
  /** The copy of the app that is served. */
  readonly folder: string;
  /** From now on asked before each answer; see the static server. */
  intercept: Intercept;
  stop(): Promise<void>;
  /** Replaces everything by another build. */
  publish(folder: string): Promise<void>;
  /** Replaces the page by one with another title, and its revision in the worker, as a build would. */
  publishTitle(title: string): Promise<void>;
  /** Stops the server and removes the copy. */
  end(): Promise<void>;
}

/** Serves a copy of a built folder on a port of its own. */
export async function openSite(built: string): Promise<Site> {
  const folder = await mkdtemp(join(tmpdir(), "fadewright-site-"));
  await cp(built, folder, { recursive: true });
  const server = createStaticServer(folder, (path, response) => site.intercept(path, response));
  await server.start(0);
  const { url, requests } = server;

  const edit = async (name: string, before: RegExp, after: string): Promise<void> => {
    const path = join(folder, name);
    const text = await readFile(path, "utf8");
    if (!before.test(text)) throw new RangeError(`${name} has nothing like ${before}`);
    await writeFile(path, text.replace(before, after));
  };

  const site: Site = {
    url,
    requests,
    folder,
    intercept: () => false,
    stop: () => server.stop(),
    async publish(next) {
      await rm(folder, { recursive: true });
      await cp(next, folder, { recursive: true });
    },
    async publishTitle(title) {
      await edit("index.html", /<title>[^<]*<\/title>/, `<title>${title}</title>`);
      await edit(
        "sw.js",
        /"revision":"\w+","url":"index.html"/,
        `"revision":"${title}","url":"index.html"`,
      );
    },
    async end() {
      await server.stop();
      await rm(folder, { recursive: true, force: true });
    },
  };
  return site;
}
