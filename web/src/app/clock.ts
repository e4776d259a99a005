/** The service's clock, which all pages count by; until it has answered, this device's. */
let offsetMs = 0;

export function setServiceTime(nowUtc: string): void {
  const serviceMs = Date.parse(nowUtc);
  if (Number.isFinite(serviceMs)) offsetMs = serviceMs - Date.now();
}

export function nowMs(): number {
  return Date.now() + offsetMs;
}

const tickers = new Set<(nowMs: number) => void>();

/** Calls back once a second, on the second, until the returned function is called. */
export function eachSecond(callback: (nowMs: number) => void): () => void {
  tickers.add(callback);
  if (tickers.size === 1) schedule();
  return () => tickers.delete(callback);
}

function schedule(): void {
  setTimeout(() => {
    if (tickers.size === 0) return;
    const now = nowMs();
    for (const ticker of [...tickers]) ticker(now);
    schedule();
  }, 1000 - (nowMs() % 1000) + 5);
}

/** Calls back each `periodMs` while the page is seen, and at once when it comes back into sight after that long. */
export function whileVisible(periodMs: number, callback: () => void): () => void {
  let last = Date.now();
  const run = () => {
    if (document.visibilityState !== 'visible' || Date.now() - last < periodMs) return;
    last = Date.now();
    callback();
  };
  const timer = setInterval(run, 1000);
  document.addEventListener('visibilitychange', run);
  return () => {
    clearInterval(timer);
    document.removeEventListener('visibilitychange', run);
  };
}
