import { setTimeout as pause } from "node:timers/promises";

const SCREEN = { width: 390, height: 844, deviceScaleFactor: 2, mobile: true };
/** The browser's own work after its start is over by then. */
const SETTLE_BEFORE_MS = 600;
/** A load has ended when this long no long task has followed. */
const QUIET_AFTER_MS = 600;
const LIMIT_MS = 60_000;

/**
 * Loads a page once and times it, in ms from the start of the navigation:
 *
 * paint        first contentful paint
 * ready        the selector `ready` first matched
 * tap          a click on `tap` first made `effect` match
 * interactive  the latest of those and of the end of the last task above 50 ms
 *
 * @param throttle  By how much the page's main thread is slowed. 1 = not at all
 * @throws Error    If the page is not there, or not all of it within a minute.
 */
export async function timeLoad({ send }, page, throttle) {
  await watchFor(send, page);
  await send("Emulation.setCPUThrottlingRate", { rate: throttle });
  await pause(SETTLE_BEFORE_MS);
  const { errorText } = await send("Page.navigate", { url: page.url });
  if (errorText) throw new Error(`${page.name}: ${errorText}`);
  const seen = await poll(send, page, "bench", ({ paint, ready, tap, lastTask, now }) => {
    if (paint === null || ready === null || tap === null) return false;
    return now - Math.max(paint, ready, tap, lastTask) > QUIET_AFTER_MS;
  });
  const { paint, ready, tap, lastTask, isControlled, wasThere } = seen;
  if (wasThere) throw new Error(`${page.name}: ${page.effect} was there before the tap`);
  if (!isControlled) throw new Error(`${page.name}: not answered by its service worker`);
  return { paint, ready, tap, interactive: Math.max(paint, ready, tap, lastTask) };
}

/** Loads a page, and waits until its service worker is active and the files have reached the disk. */
export async function install({ send }, page) {
  await watchFor(send, { ...page, tap: null });
  const { errorText } = await send("Page.navigate", { url: page.url });
  if (errorText) throw new Error(`${page.name}: ${errorText}`);
  await poll(send, page, "install", ({ ready, isActive }) => ready !== null && isActive);
  await pause(1500);
}

async function watchFor(send, { ready, tap, effect }) {
  // Without it the script below is taken and never run.
  await send("Page.enable");
  await send("Emulation.setDeviceMetricsOverride", SCREEN);
  const source = `(${watch})(${JSON.stringify({ ready, tap, effect })})`;
  await send("Page.addScriptToEvaluateOnNewDocument", { source });
}

async function poll(send, { name }, job, isDone) {
  const expression = "globalThis.__bench?.()";
  const start = Date.now();
  for (;;) {
    const { result } = await send("Runtime.evaluate", { expression, returnByValue: true });
    if (result.value && isDone(result.value)) return result.value;
    if (Date.now() - start > LIMIT_MS) {
      throw new Error(`${name}: ${job} has not ended: ${JSON.stringify(result.value)}`);
    }
    await pause(100);
  }
}

/** Runs in the page, before any script of its own; must not refer to anything outside. */
function watch({ ready, tap, effect }) {
  const seen = {
    paint: null,
    ready: null,
    tap: null,
    lastTask: 0,
    isActive: false,
    wasThere: false,
  };
  const observe = (type, hear) =>
    new PerformanceObserver((list) => list.getEntries().forEach(hear)).observe({
      type,
      buffered: true,
    });
  observe("paint", ({ name, startTime }) => {
    if (name === "first-contentful-paint") seen.paint = startTime;
  });
  observe("longtask", ({ startTime, duration }) => {
    seen.lastTask = Math.max(seen.lastTask, startTime + duration);
  });
  const look = () => {
    if (seen.ready === null && document.querySelector(ready)) {
      seen.ready = performance.now();
      seen.wasThere = document.querySelector(effect) !== null;
      if (tap !== null) press();
    }
    if (seen.ready !== null && seen.tap === null && document.querySelector(effect)) {
      seen.tap = performance.now();
      observer.disconnect();
    }
  };
  // A tap before the page listens is lost, as a finger's would be; so once for each frame.
  const press = () => {
    if (seen.tap !== null) return;
    document.querySelector(tap)?.click();
    requestAnimationFrame(press);
  };
  const observer = new MutationObserver(look);
  observer.observe(document, { childList: true, subtree: true, attributes: true });
  navigator.serviceWorker?.ready.then(({ active }) => {
    const note = () => {
      seen.isActive = active.state === "activated";
    };
    active.addEventListener("statechange", note);
    note();
  });
  globalThis.__bench = () => ({
    ...seen,
    now: performance.now(),
    isControlled: navigator.serviceWorker?.controller != null,
  });
}
