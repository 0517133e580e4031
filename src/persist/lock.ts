/** One writer for each project across tabs. Where the browser has no locks, the revision counter alone decides. */

export interface Hold {
  /** Gives the project free for another tab. */
  release(): void;
}

export interface LockOptions {
  readonly locks: Pick<LockManager, 'request'> | undefined;
  /** Another tab asks for the project: keep what is not yet kept; it is given up afterwards. */
  readonly onAsked: (id: string) => Promise<void>;
  /** The project is no longer this tab's. */
  readonly onLost: (id: string) => void;
}

export interface Locks {
  /** The project for this tab, or undefined if another one holds it. */
  claim(id: string): Promise<Hold | undefined>;
  /** The project for this tab in any case: asks the other to give it up, and takes it if there is no answer. */
  takeOver(id: string): Promise<Hold>;
}

const PATIENCE = 2_000; // ms a tab has to give a project up

const nameOf = (id: string): string => `headwright project ${id}`;

export function createLocks(options: LockOptions): Locks {
  const { locks } = options;
  if (locks === undefined) {
    const free: Hold = { release: () => undefined };
    return { claim: async () => free, takeOver: async () => free };
  }
  return {
    claim: (id) => request(options, locks, id, { ifAvailable: true }),
    takeOver: async (id) => {
      const channel = new BroadcastChannel(nameOf(id));
      channel.postMessage('wanted');
      channel.close();
      const patience = AbortSignal.timeout(PATIENCE);
      const hold =
        (await request(options, locks, id, { signal: patience }).catch(() => undefined)) ??
        (await request(options, locks, id, { steal: true }));
      if (hold === undefined) throw new Error(`expected the lock of ${id} once taken, got none`);
      return hold;
    },
  };
}

/** ifAvailable, signal or steal. */
type Manner = NonNullable<Parameters<LockManager['request']>[1] & object>;

/** Resolves once the lock is held (or is not to be had); it stays held until released or taken. */
function request(
  options: LockOptions,
  locks: Pick<LockManager, 'request'>,
  id: string,
  how: Manner,
): Promise<Hold | undefined> {
  return new Promise((resolve, reject) => {
    let hold: Hold | undefined;
    const holding = locks.request(nameOf(id), how, (lock) => {
      if (lock === null) return resolve(undefined);
      return new Promise<void>((end) => {
        hold = holdOn(options, id, end);
        resolve(hold);
      });
    });
    holding.catch((cause: unknown) => {
      if (hold === undefined) return reject(cause);
      hold.release(); // taken by another tab
      options.onLost(id);
    });
  });
}
/** Holds the project and gives it up in good order when another tab asks for it. */
function holdOn({ onAsked, onLost }: LockOptions, id: string, end: () => void): Hold {
  const channel = new BroadcastChannel(nameOf(id));
  const release = (): void => {
    channel.close();
    end();
  };
  channel.onmessage = () => {
    void onAsked(id).finally(() => {
      release();
      onLost(id);
    });
  };
  return { release };
}
