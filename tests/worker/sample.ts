/** A meter with a log of its own, for the worker. */
import type { OfMeter } from '../../src/core/log/look.ts';
import type { Output } from '../../src/worker/output.ts';

export const ofMeter: OfMeter = {
  index: 0,
  project: {},
  meter: {
    tag: 'FE-1101',
    fluid: { kind: 'water' },
    upstream: { pressure: '7 bar(g)', temperature: '85 degC' },
    pipe: { bore: '102.26 mm' },
    element: { kind: 'orifice-plate', tappings: 'flange', bore: '62.5 mm' },
    duty: { maximum: '60 t/h' },
    differential: '250 mbar',
    find: 'flow',
    log: {
      time: 'time',
      differential: { column: 'dp', unit: 'mbar' },
      pressure: { column: 'p', unit: 'bar(g)' },
      temperature: { column: 't', unit: 'degC' },
    },
  },
};

/** A log of so many seconds. */
export function logOf(rows: number): string {
  const lines = ['time,dp,p,t'];
  for (let row = 0; row < rows; row += 1) {
    const stamp = new Date(Date.UTC(2026, 2, 1) + row * 1000).toISOString().slice(0, 19);
    lines.push(`${stamp}Z,${100 + (row % 97)}.25,7.0${row % 10},85.${row % 7}`);
  }
  return `${lines.join('\n')}\n`;
}

export interface Kept extends Output {
  readonly text: () => string;
  discarded: boolean;
}

/** An output that remembers. */
export function keepingOutput(): Kept {
  const parts: Uint8Array<ArrayBuffer>[] = [];
  const kept: Kept = {
    discarded: false,
    write: (bytes) => void parts.push(bytes.slice()),
    finish: async () => new Blob(parts),
    discard: async () => {
      kept.discarded = true;
    },
    text: () => new TextDecoder().decode(Buffer.concat(parts)),
  };
  return kept;
}
