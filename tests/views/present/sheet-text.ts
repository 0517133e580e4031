/** A presented meter as plain text: what a golden holds. */
import type { Expression } from '../../../src/views/present/formula.ts';
import { nameOf } from '../../../src/views/present/formula.ts';
import type { PresentedSizing, Row } from '../../../src/views/present/model.ts';

export function formulaText(e: Expression): string {
  switch (e.type) {
    case 'number':
      return e.text;
    case 'name':
      return nameOf(e);
    case 'negative':
      return `−${formulaText(e.of)}`;
    case 'sum':
      return `${formulaText(e.left)} ${e.sign} ${formulaText(e.right)}`;
    case 'product':
      return `${formulaText(e.left)}·${formulaText(e.right)}`;
    case 'quotient':
      return `${formulaText(e.left)}/${formulaText(e.right)}`;
    case 'power':
      return `${formulaText(e.base)}^${formulaText(e.exponent)}`;
    case 'group':
      return `(${formulaText(e.of)})`;
    case 'call':
      return `${e.name}(${e.arguments.map(formulaText).join('; ')})`;
  }
}

const rowText = ({ label, symbol, value, cited, note }: Row): string =>
  `  ${label}${symbol === undefined ? '' : ` ${symbol}`}: ${value.text}` +
  `${cited === undefined ? '' : ` [${cited.clause}${cited.mark}]`}${note === undefined ? '' : ` (${note})`}`;

export function sheetText(meter: PresentedSizing): string {
  const lines = [
    `${meter.tag} ${meter.service} — ${meter.element}, ${meter.standard} — ${meter.verdict.words}`,
    meter.answer.map(({ text, role }) => (role === 'found' ? `*${text}*` : text)).join(''),
    meter.under,
    `found: ${meter.found.value.text}, ${meter.found.from}; loss ${meter.loss?.text ?? 'not known'}`,
    `fluid: ${meter.fluid.name}, ${meter.fluid.phase}`,
    ...meter.state.map(rowText),
    'pipe:',
    ...meter.pipe.map(rowText),
    'element:',
    ...meter.metal.map(rowText),
    'duty:',
    ...meter.duty.flatMap(({ label, cells, terms, verdict }) => [
      `  ${label}: ${Object.values(cells)
        .map(({ text }) => text)
        .join(' | ')} (${verdict})`,
      `    ${terms.map((term) => `${term.label} ${term.value.text}`).join('; ')}`,
    ]),
    'checks:',
    ...meter.checks.flatMap((group) => [
      `  ${group.title} (${group.verdict})`,
      ...group.rows.map(
        (row) => `    ${row.verdictWord}: ${row.text} — ${row.limit} [${row.cited.clause}${row.cited.mark}]`,
      ),
    ]),
    'working:',
    ...meter.working.flatMap((group) => [
      `  ${group.title}`,
      ...group.rows.map((row) => {
        const chain = [row.symbol, row.formula, row.substituted].flatMap((e) =>
          e === undefined ? [] : [formulaText(e)],
        );
        return `    ${row.title}: ${[...chain, row.value.text].join(' = ')} [${row.cited.clause}${row.cited.mark}] ${row.remark ?? ''}`.trimEnd();
      }),
    ]),
    'dimensions:',
    ...meter.dimensions.map(({ label, symbol, text }) => `  ${label} ${symbol ?? ''}: ${text}`),
    'straight:',
    ...meter.straight.map(({ label, full, reduced, note, chosen }) =>
      `  ${chosen ? '*' : ''}${label}: ${full}, ${reduced} ${note ?? ''}`.trimEnd(),
    ),
    meter.heads === undefined
      ? 'heads: none'
      : `heads: ${meter.heads.tappingDrop.text} across the tappings, ${meter.heads.loss.text} lost`,
    `chart: ${meter.chart.flowUnit} against ${meter.chart.differentialUnit}. ${meter.chart.summary}`,
    'notes:',
    ...[...meter.notes, ...meter.cautions].map((note) => `  ${note}`),
  ];
  return `${lines.join('\n')}\n`;
}
