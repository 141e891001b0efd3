import { readFile, stat } from "node:fs/promises";
import { createServer } from "node:http";
import { extname, join, resolve, sep } from "node:path";

const TYPES = {
  ".html": "text/html; charset=utf-8",
  ".js": "text/javascript; charset=utf-8",
  ".css": "text/css; charset=utf-8",
  ".json": "application/json; charset=utf-8",
  ".webmanifest": "application/manifest+json; charset=utf-8",
  ".svg": "image/svg+xml",
  ".png": "image/png",
};
const HOST = "127.0.0.1";

/**
 * A web server for the files of one folder, on this machine only. What is missing is missing (404):
 * a server that answers with the start page instead would hide a broken service worker.
 *
 * @param folder     Folder to serve.
 * @param intercept  Called with the path and the response before each answer, and awaited; true: it
 *                   has answered.
 */
export function createStaticServer(folder, intercept = () => false) {
  const root = resolve(folder);
  const sockets = new Set();
  const requests = [];
  let server;
  let port;

  const answer = async (request, response) => {
    const path = pathOf(request);
    requests.push(path);
    if (await intercept(path, response)) return;
    if (!["GET", "HEAD"].includes(request.method)) return response.writeHead(405).end();
    const file = join(root, path.endsWith("/") ? `${path}index.html` : path);
    const isInside = path !== "" && file.startsWith(root + sep);
    const found = isInside ? await stat(file).catch(nullIfMissing) : null;
    if (found?.isDirectory())
      return response.writeHead(301, { location: `${encodeURI(path)}/` }).end();
    if (!found?.isFile()) return response.writeHead(404).end();
    const content = await readFile(file);
    response.writeHead(200, {
      "content-type": TYPES[extname(file)] ?? "application/octet-stream",
      "content-length": content.length,
      "cache-control": "no-cache",
    });
    response.end(request.method === "HEAD" ? undefined : content);
  };

  return {
    /** Paths asked for, in order. */
    requests,

    /** Without a slash at the end. */
    get url() {
      if (port === undefined) throw new RangeError("url: the server has never been started");
      return `http://${HOST}:${port}`;
    },

    /** @param wantedPort  0: any that is free. @throws Error with code EADDRINUSE */
    async start(wantedPort) {
      const starting = createServer((request, response) => {
        answer(request, response).catch((error) => response.destroy(error));
      });
      starting.on("connection", (socket) => {
        sockets.add(socket);
        socket.on("close", () => sockets.delete(socket));
      });
      await new Promise((done, fail) => {
        starting.once("error", fail).listen(wantedPort, HOST, done);
      });
      server = starting;
      port = server.address().port;
    },

    /** Ends open connections too; a browser would keep them, and a stop would wait for it. */
    async stop() {
      if (server === undefined) return;
      const stopped = new Promise((done) => server.close(done));
      server = undefined;
      for (const socket of sockets) socket.destroy();
      await stopped;
    },
  };
}

/** Empty if the address makes no sense. */
function pathOf(request) {
  try {
    const path = decodeURIComponent(new URL(`http://${HOST}${request.url}`).pathname);
    return path.includes("\0") ? "" : path;
  } catch (error) {
    if (error instanceof URIError || error.code === "ERR_INVALID_URL") return "";
    throw error;
  }
}

function nullIfMissing(error) {
  if (["ENOENT", "ENOTDIR", "ENAMETOOLONG"].includes(error.code)) return null;
  throw error;
}
