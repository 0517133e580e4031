/** The part of the browser's lock manager that tabs share: one holder, a queue, taking by force. */
export function lockManager(): Pick<LockManager, 'request'> {
  interface Held {
    readonly end: (cause?: unknown) => void;
  }
  const held = new Map<string, Held>();
  const queue: { name: string; go: () => void }[] = [];
  const run = (name: string, use: (lock: Lock) => unknown): Promise<unknown> =>
    new Promise((resolve, reject) => {
      const mine: Held = { end: (cause) => (cause === undefined ? resolve(undefined) : reject(cause)) };
      held.set(name, mine);
      void Promise.resolve(use({ name, mode: 'exclusive' })).then((value) => {
        if (held.get(name) !== mine) return;
        held.delete(name);
        resolve(value);
        const next = queue.findIndex((waiting) => waiting.name === name);
        if (next >= 0) queue.splice(next, 1)[0]?.go();
      });
    });
  const request = async (
    name: string,
    how: globalThis.LockOptions,
    use: (lock: Lock | null) => unknown,
  ): Promise<unknown> => {
    const holder = held.get(name);
    if (holder === undefined) return run(name, use);
    if (how.ifAvailable) return use(null);
    if (how.steal) {
      held.delete(name);
      holder.end(new DOMException('taken', 'AbortError'));
      return run(name, use);
    }
    return new Promise((resolve, reject) => {
      const waiting = { name, go: () => resolve(run(name, use)) };
      queue.push(waiting);
      how.signal?.addEventListener('abort', () => {
        queue.splice(queue.indexOf(waiting), 1);
        reject(how.signal?.reason);
      });
    });
  };
  return { request: request as LockManager['request'] };
}
