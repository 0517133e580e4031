/** One page: what it is about, its content, and the title block at its foot. */
import { type ReactNode, use } from 'react';
import type { SheetHead } from '../present/sheet.ts';
import { sheetOf } from '../words/sheet.ts';
import styles from './Page.module.css';
import { type Place, SheetContext } from './paper.ts';
import { TitleBlock } from './TitleBlock.tsx';

interface PageProps {
  readonly place: Place;
  readonly head: SheetHead;
  readonly type: string; // 'Sizing sheet'
  readonly verdict: string;
  readonly children: ReactNode;
}

export function Page({ head, type, verdict, place, children }: PageProps) {
  const { paper } = use(SheetContext);
  const { project, tag, service, element, standard, revision, warning } = head;
  const subject = [element, standard].filter(Boolean).join(', ');
  return (
    <section className={`${styles.page} ${styles[paper]}`} aria-label={`${tag}, ${type}, ${sheetOf(place)}`}>
      <header className={styles.head}>
        <div>
          <h2>
            {tag} <span>{service}</span>
          </h2>
          <p>{subject}</p>
        </div>
        <div className={styles.side}>
          <p>{project}</p>
          <p>{[type, revision && `revision ${revision}`].filter(Boolean).join(', ')}</p>
          <p className={styles.verdict}>{verdict}</p>
        </div>
      </header>
      {warning && <p className={styles.warning}>{warning}</p>}
      {children}
      <TitleBlock head={head} type={type} place={place} />
    </section>
  );
}
