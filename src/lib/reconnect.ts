import { NetworkError } from './problem';

const EVERY_MS = 4000;

interface Waiting {
  /** Fetches anew what could not be fetched. */
  resume: () => void;
  /** Whether the server answers at all. */
  isThere: () => Promise<boolean>;
}

/**
 * After a request that did not reach the server, knocks until it answers, then fetches what failed. The browser's own
 * word on being online is taken as a hint only: the network may be there and the server not.
 */
export function createReconnect({ resume, isThere }: Waiting) {
  let timer: ReturnType<typeof setTimeout> | undefined;
  let isAsking = false;
  let stopped = false;
  const wait = () => {
    timer = setTimeout(knock, EVERY_MS);
  };
  const knock = async () => {
    isAsking = true;
    const isBack = await isThere();
    isAsking = false;
    if (stopped) return;
    if (!isBack) return wait();
    timer = undefined;
    resume();
  };
  return {
    failed(error: unknown): void {
      if (error instanceof NetworkError && timer === undefined) wait();
    },
    /** The browser says that it is online again: no need to wait for the next knock. */
    hint(): void {
      if (timer === undefined || isAsking) return;
      clearTimeout(timer);
      void knock();
    },
    stop(): void {
      stopped = true;
      clearTimeout(timer);
    },
  };
}

export const serverAnswers = (): Promise<boolean> =>
  fetch('/api/health', { cache: 'no-store' }).then(
    (response) => response.ok,
    () => false,
  );
