/** The same data as a table, for whoever does not see the chart. */
import type { Chart } from '../present/model.ts';
import styles from './chart.module.css';
import { plain } from './series.ts';
import type { ChartLabels } from './words.ts';

const rowsShown = 12;

/** About a dozen points, the first and the last among them. */
function thinned<Item>(items: readonly Item[]): readonly Item[] {
  const every = Math.max(1, Math.ceil(items.length / rowsShown));
  return items.filter((_, index) => index % every === 0 || index === items.length - 1);
}

export function Twin({ chart, labels }: { readonly chart: Chart; readonly labels: ChartLabels }) {
  const rows = [
    ...thinned(chart.points).map((point) => ({ ...point, name: point.inside ? labels.inside : labels.outside })),
  ];
  return (
    <div className={styles.hidden}>
      <table>
        <caption>{labels.title}</caption>
        <thead>
          <tr>
            <th scope="col">{`Δp / ${chart.differentialUnit}`}</th>
            <th scope="col">{`q / ${chart.flowUnit}`}</th>
            {chart.banded && <th scope="col">{labels.low}</th>}
            {chart.banded && <th scope="col">{labels.high}</th>}
            {chart.limited && <th scope="col">{labels.limits}</th>}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={row.differential}>
              <th scope="row">{plain(row.differential)}</th>
              <td>{plain(row.flow)}</td>
              {chart.banded && <td>{plain(row.low)}</td>}
              {chart.banded && <td>{plain(row.high)}</td>}
              {chart.limited && <td>{row.name}</td>}
            </tr>
          ))}
          {chart.duty.map((duty) => (
            <tr key={duty.name}>
              <th scope="row">{plain(duty.differential)}</th>
              <td>{plain(duty.flow)}</td>
              {/* as wide as the columns above leave; alone where there are none */}
              <td colSpan={Math.max(1, (chart.banded ? 2 : 0) + (chart.limited ? 1 : 0))}>{duty.label}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
