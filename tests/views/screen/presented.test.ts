import { describe, expect, it } from 'vitest';
import { presented, presentedEarlier, rememberOrigins } from '../../../src/views/screen/presented.ts';
import { openMeter } from './workbench.ts';

const words = (sizing: ReturnType<typeof presentedEarlier>): string =>
  sizing?.answer.map(({ text }) => text).join('') ?? '';

describe('the last good result', () => {
  it('is shown with the figures it was computed from, not with what is typed now', () => {
    const { store, solved, meter } = openMeter();
    rememberOrigins(store.getState());
    store.subscribe(rememberOrigins);
    const earlier = solved();
    store.getState().write('differential', '-3 bar');
    const { project, results, lastSolved, keys } = store.getState();
    expect(results.results[0]?.status).toBe('refused');
    expect(lastSolved[keys[0] ?? '']).toBe(earlier);
    expect(words(presentedEarlier(project, earlier))).toContain('250');
    expect(words(presentedEarlier(project, earlier))).not.toContain('3\u00a0bar');
    expect(presented(meter(), project, results.results[0] ?? earlier).status).toBe('refused');
  });

  it('is presented once while nothing changes, and again in another display', () => {
    const { store, solved, meter } = openMeter();
    const { project } = store.getState();
    const first = presented(meter(), project, solved());
    expect(presented(meter(), project, solved())).toBe(first);
    expect(presented(meter(), { ...project, display: 'US' }, solved())).not.toBe(first);
  });
});
