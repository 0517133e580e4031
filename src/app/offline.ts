/**
 * Keeps the app for use without a network: the service worker holds every file of the build. A new version waits
 * until the user takes it, so that a page never changes under the hand.
 */
import { registerSW } from 'virtual:pwa-register';

const HOUR = 3_600_000; // ms

/**
 * Registers the service worker.
 * @param onUpdate called when a new version waits; its argument takes it and loads the page anew
 * @param onReady called once the app is kept and works without a network
 */
export const registerOffline = (onUpdate: (apply: () => void) => void, onReady: () => void): void => {
  const update = registerSW({
    onNeedRefresh: () => onUpdate(() => void update(true)),
    onOfflineReady: onReady,
    onRegisteredSW: (_url, registration) => {
      if (!registration) return;
      const look = (): void => {
        // Without a network there is nothing newer to find: the kept version goes on.
        registration.update().catch(() => undefined);
      };
      look();
      setInterval(look, HOUR);
    },
  });
};
