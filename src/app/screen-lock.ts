/** Keeps the screen on while wanted; the browser drops the lock whenever the app is hidden. */
export function createScreenLock(): (wanted: boolean) => void {
  let isWanted = false;
  let lock: WakeLockSentinel | null = null;
  const settle = async (): Promise<void> => {
    if (!("wakeLock" in navigator)) return;
    if (isWanted && lock === null && document.visibilityState === "visible") {
      try {
        lock = await navigator.wakeLock.request("screen");
      } catch (refused) {
        // Low battery or a setting of the phone: the screen follows the phone then.
        if (!(refused instanceof DOMException)) throw refused;
        return;
      }
      lock.addEventListener("release", () => {
        lock = null;
      });
    }
    if (!isWanted && lock !== null) await lock.release();
  };
  addEventListener("visibilitychange", () => void settle());
  return (wanted) => {
    isWanted = wanted;
    void settle();
  };
}
