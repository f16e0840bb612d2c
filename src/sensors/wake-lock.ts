/** Keeps the screen on until the returned function is called; the platform lets go whenever the page is hidden. */
export function keepAwake(): () => void {
  const keeper = navigator.wakeLock as WakeLock | undefined;
  if (!keeper) return () => undefined;
  let lock: WakeLockSentinel | null = null;
  let wanted = true;
  const ask = async () => {
    if (!wanted || document.visibilityState !== 'visible') return;
    try {
      const got = await keeper.request('screen');
      // The wish may have ended while the platform was asked.
      if (wanted) lock = got;
      else await got.release();
    } catch {
      // Refused, as with a nearly empty battery: the screen goes dark as it always does.
    }
  };
  const askAgain = () => void ask();
  document.addEventListener('visibilitychange', askAgain);
  askAgain();
  return () => {
    wanted = false;
    document.removeEventListener('visibilitychange', askAgain);
    void lock?.release().catch(() => undefined);
  };
}
