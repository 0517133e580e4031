/** Every check with its limit, the terms of the uncertainty, and the sources that the sheets of this meter name. */
import type { ReactNode } from 'react';
import type { SizingSheet } from '../present/sheet.ts';
import type { CheckBlock, TermTable } from '../present/sheet-tables.ts';
import type { SourceLine } from '../present/sources.ts';
import { checkHeads, checksAre, sheetWords } from '../words/sheet.ts';
import { Block } from './Block.tsx';
import styles from './content.module.css';
import { Notes } from './Notes.tsx';
import { Page } from './Page.tsx';
import type { Place } from './paper.ts';
import tables from './table.module.css';

/** The same for a meter and for a survey. */
interface Props {
  readonly sheet: Pick<SizingSheet, 'head' | 'checks' | 'terms' | 'sources'> & {
    readonly meter: Pick<SizingSheet['meter'], 'notes'> & { readonly verdict: { readonly words: string } };
  };
  readonly place: Place;
  readonly type?: string;
  /** What stands before the checks. */
  readonly children?: ReactNode;
}

export function ChecksSheet({ sheet, place, type = sheetWords.checksSheet, children }: Props) {
  const { head, meter, checks, terms, sources } = sheet;
  return (
    <Page head={head} type={type} verdict={checksAre(meter.verdict.words)} place={place}>
      {children}
      <Checks blocks={checks} />
      {terms.rows.length > 0 && <Terms table={terms} />}
      <Sources lines={sources} />
      <Notes lines={meter.notes} />
    </Page>
  );
}

function Checks({ blocks }: { readonly blocks: readonly CheckBlock[] }) {
  return (
    <Block title={sheetWords.checks}>
      <table className={`${tables.table} ${tables.checks}`}>
        <thead>
          <tr>
            {Object.values(checkHeads).map((head) => (
              <th key={head} scope="col">
                {head}
              </th>
            ))}
          </tr>
        </thead>
        {blocks.map((block) => (
          <Assumption key={block.assumption} block={block} />
        ))}
      </table>
    </Block>
  );
}

/** The checks of one assumption; what could not be checked stands last. */
function Assumption({ block: { title, rows, open } }: { readonly block: CheckBlock }) {
  const head = (
    <th scope="rowgroup" rowSpan={rows.length + open.length}>
      {title}
    </th>
  );
  return (
    <tbody>
      {rows.map(({ key, text, limit, source, verdict, verdictWord }, at) => (
        <tr key={key}>
          {at === 0 && head}
          <td>{text}</td>
          <td>{limit}</td>
          <td className={verdict === 'inside' ? undefined : tables.loud}>{verdictWord}</td>
          <td>{source}</td>
        </tr>
      ))}
      {open.map((text, at) => (
        <tr key={text}>
          {rows.length + at === 0 && head}
          <td colSpan={4}>{text}</td>
        </tr>
      ))}
    </tbody>
  );
}

function Terms({ table: { terms, rows } }: { readonly table: TermTable }) {
  return (
    <Block title={sheetWords.terms}>
      <table className={tables.table}>
        <thead>
          <tr>
            <td />
            {terms.map((term) => (
              <th key={term} scope="col">
                {term}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map(({ label, cells }) => (
            <tr key={label}>
              <th scope="row">{label}</th>
              {cells.map((cell, at) => (
                <td key={terms[at]}>{cell}</td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </Block>
  );
}

function Sources({ lines }: { readonly lines: readonly SourceLine[] }) {
  return (
    <Block title={sheetWords.sources}>
      <ol className={styles.sources}>
        {lines.map(({ key, clause }) => (
          <li key={key}>
            {key} {clause}
          </li>
        ))}
      </ol>
    </Block>
  );
}
