import { spawn } from "node:child_process";
import { setTimeout as pause } from "node:timers/promises";

const FLAGS = [
  "--headless",
  "--no-sandbox",
  "--disable-gpu",
  "--no-first-run",
  "--no-default-browser-check",
  "--disable-background-networking",
  "--disable-component-update",
  "--disable-default-apps",
  "--disable-extensions",
  "--disable-sync",
  "--mute-audio",
  "--hide-scrollbars",
  "--password-store=basic",
  "--window-size=390,844",
  "--remote-debugging-pipe",
];
const CLOSE_LIMIT_MS = 8000;

/**
 * Starts a Chromium process on a profile folder and attaches to its page over a pipe, and to
 * nothing else: a debugger on the service worker would slow the very start that is measured.
 *
 * @returns `send(method, params)` for the DevTools protocol, and `close()`.
 */
export async function openBrowser(executable, profile) {
  const child = spawn(executable, [...FLAGS, `--user-data-dir=${profile}`, "about:blank"], {
    stdio: ["ignore", "ignore", "ignore", "pipe", "pipe"],
  });
  const waiting = new Map();
  const gone = new Promise((resolve) => {
    child.once("exit", resolve);
    child.once("error", resolve);
  }).then((reason) => {
    const error = new Error(`the browser ended (${reason})`);
    for (const { reject } of waiting.values()) reject(error);
    waiting.clear();
    return error;
  });
  let isGone = false;
  void gone.then(() => {
    isGone = true;
  });
  const [, , , input, output] = child.stdio;
  // A write to a browser that has just ended; `gone` tells those who wait.
  input.on("error", () => child.kill());
  readMessages(output, (message) => {
    const call = waiting.get(message.id);
    if (call === undefined) return;
    waiting.delete(message.id);
    if (message.error) call.reject(new Error(`${call.method}: ${message.error.message}`));
    else call.resolve(message.result);
  });
  let lastId = 0;
  const sendTo = async (sessionId, method, params = {}) => {
    if (isGone) throw await gone;
    lastId += 1;
    const id = lastId;
    return new Promise((resolve, reject) => {
      waiting.set(id, { method, resolve, reject });
      input.write(`${JSON.stringify({ id, sessionId, method, params })}\0`);
    });
  };
  const close = async () => {
    // The browser may end before it answers; that it ended is all that is wanted.
    sendTo(undefined, "Browser.close").catch(() => child.kill());
    const timer = setTimeout(() => child.kill("SIGKILL"), CLOSE_LIMIT_MS);
    await gone;
    clearTimeout(timer);
  };
  try {
    const targetId = await pageOf(sendTo);
    const { sessionId } = await sendTo(undefined, "Target.attachToTarget", {
      targetId,
      flatten: true,
    });
    return { send: (method, params) => sendTo(sessionId, method, params), close };
  } catch (error) {
    await close();
    throw error;
  }
}

async function pageOf(sendTo) {
  for (let attempt = 0; attempt < 500; attempt += 1) {
    const { targetInfos } = await sendTo(undefined, "Target.getTargets");
    const page = targetInfos.find(({ type }) => type === "page");
    if (page) return page.targetId;
    await pause(20);
  }
  throw new Error("the browser showed no page");
}

/** Messages come as JSON with a zero byte behind each. */
function readMessages(stream, hear) {
  let rest = Buffer.alloc(0);
  stream.on("data", (chunk) => {
    rest = Buffer.concat([rest, chunk]);
    for (let end = rest.indexOf(0); end >= 0; end = rest.indexOf(0)) {
      hear(JSON.parse(rest.subarray(0, end).toString()));
      rest = rest.subarray(end + 1);
    }
  });
}
