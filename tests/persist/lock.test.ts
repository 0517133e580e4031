import { expect, test } from 'vitest';
import { createLocks, type Locks } from '../../src/persist/lock.ts';
import { lockManager } from './lock-manager.ts';

interface Tab extends Locks {
  readonly told: string[];
}

function tab(
  locks: Pick<LockManager, 'request'> | undefined,
  onAsked: () => Promise<void> = async () => undefined,
): Tab {
  const told: string[] = [];
  const made = createLocks({
    locks,
    onAsked: (id) => {
      told.push(`asked ${id}`);
      return onAsked();
    },
    onLost: (id) => told.push(`lost ${id}`),
  });
  return { ...made, told };
}

test('one tab holds a project; another gets another one, and this one when it is free', async () => {
  const manager = lockManager();
  const [one, two] = [tab(manager), tab(manager)];
  const hold = await one.claim('a');
  expect(hold).toBeDefined();
  expect(await two.claim('a')).toBeUndefined();
  const other = await two.claim('b');
  expect(other).toBeDefined();
  hold?.release();
  await new Promise((resolve) => setTimeout(resolve));
  const now = await two.claim('a');
  expect(now).toBeDefined();
  expect([one.told, two.told]).toEqual([[], []]);
  now?.release();
  other?.release();
});

test('a tab that is asked keeps its work first and then gives the project up', async () => {
  const manager = lockManager();
  const order: string[] = [];
  const one = tab(manager, async () => {
    await new Promise((resolve) => setTimeout(resolve, 20));
    order.push('kept');
  });
  const two = tab(manager);
  await one.claim('a');
  const hold = await two.takeOver('a');
  order.push('taken');
  expect(order).toEqual(['kept', 'taken']);
  expect(one.told).toEqual(['asked a', 'lost a']);
  hold.release();
});

test('from a tab that does not answer the project is taken within five seconds', async () => {
  const manager = lockManager();
  const one = tab(manager, () => new Promise(() => undefined));
  const two = tab(manager);
  await one.claim('a');
  const start = performance.now();
  const hold = await two.takeOver('a');
  expect(performance.now() - start).toBeLessThan(5000);
  await new Promise((resolve) => setTimeout(resolve));
  expect(one.told).toEqual(['asked a', 'lost a']);
  expect(await one.claim('a')).toBeUndefined();
  hold.release();
});

test('without locks in the browser a tab gets what it asks for', async () => {
  const one = tab(undefined);
  expect(await one.claim('a')).toBeDefined();
  expect(await one.takeOver('a')).toBeDefined();
});
