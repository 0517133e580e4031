/** Which key orders what where the focus stands: a list of units keeps its own keys and leaves the others to the program. */
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { orderOf } from '../../../src/views/screen/shell/keys.table.ts';

class Input {
  type = 'text';
}
class Select {}
class Area {}

const order = (target: object, key: string, held: Partial<KeyboardEvent> = {}) =>
  orderOf({ key, ctrlKey: false, metaKey: false, shiftKey: false, altKey: false, target, ...held } as KeyboardEvent);
const ctrl = { ctrlKey: true };
const ctrlShift = { ctrlKey: true, shiftKey: true };

beforeEach(() => {
  vi.stubGlobal('HTMLInputElement', Input);
  vi.stubGlobal('HTMLSelectElement', Select);
  vi.stubGlobal('HTMLTextAreaElement', Area);
});
afterEach(() => vi.unstubAllGlobals());

describe('the order of a key', () => {
  it('undoes and redoes from a list, where Tab leads after a figure', () => {
    expect(order(new Select(), 'z', ctrl)).toBe('undo');
    expect(order(new Select(), 'Z', ctrlShift)).toBe('redo');
    expect(order(new Select(), 'y', ctrl)).toBe('redo');
  });
  it('leaves letters, signs and Alt with an arrow to a list', () => {
    expect(order(new Select(), '/')).toBeUndefined();
    expect(order(new Select(), 'ArrowDown', { altKey: true })).toBeUndefined();
  });
  it('leaves undo and redo inside a text box to the browser', () => {
    expect(order(new Input(), 'z', ctrl)).toBeUndefined();
    expect(order(new Area(), 'Z', ctrlShift)).toBeUndefined();
    expect(order(new Input(), 's', ctrl)).toBe('save');
  });
  it('takes every key where nothing is typed', () => {
    expect(order({}, '/')).toBe('find');
    expect(order({}, 'Z', ctrlShift)).toBe('redo');
  });
});
