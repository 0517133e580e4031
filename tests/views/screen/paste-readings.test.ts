import { describe, expect, test } from 'vitest';
import { figuresIn, inLines, inOrder, sequenceOf } from '../../../src/views/screen/survey/paste-readings.ts';

const counts = [3, 3];

describe('what stands in a paste', () => {
  test('words at the head and at the side are no readings', () => {
    expect(figuresIn('Point\tLine\na\t61\nb\t74,5\n')).toEqual([['61'], ['74,5']]);
    expect(figuresIn('1\t61\n2\t74')).toEqual([
      ['1', '61'],
      ['2', '74'],
    ]);
  });

  test('a column and a row are one after the other, a block is not', () => {
    expect(sequenceOf(figuresIn('61\n74\n85'))).toEqual(['61', '74', '85']);
    expect(sequenceOf(figuresIn('61\t74\t85'))).toEqual(['61', '74', '85']);
    expect(sequenceOf(figuresIn('61\t74\n85\t86'))).toBeUndefined();
  });
});

describe('where it goes', () => {
  test('in the order of measuring, over the end of a line; what has no point is counted', () => {
    expect(inOrder(['1', '2', '3'], counts, { line: 0, point: 2 })).toEqual({
      cells: [
        { line: 0, point: 2, text: '1' },
        { line: 1, point: 0, text: '2' },
        { line: 1, point: 1, text: '3' },
      ],
      left: 0,
    });
    expect(inOrder(['1', '2', '3'], counts, { line: 1, point: 2 }).left).toBe(2);
  });

  test('a block by rows or by columns, where it fits the plan', () => {
    const rows = figuresIn('1\t2\n3\t4\n5\t6');
    expect(inLines(rows, counts, 'rows')).toBeUndefined();
    expect(inLines(rows, counts, 'columns')?.map(({ line, point, text }) => `${line}.${point} ${text}`)).toEqual([
      '0.0 1',
      '0.1 3',
      '0.2 5',
      '1.0 2',
      '1.1 4',
      '1.2 6',
    ]);
  });
});
