/** The title block, 180 mm wide, with the fields of ISO 7200; on the first sheet with blank boxes to sign. */
import { use } from 'react';
import type { SheetHead } from '../present/sheet.ts';
import { sheetOf, titleBlock as words } from '../words/sheet.ts';
import { type Place, SheetContext } from './paper.ts';
import styles from './TitleBlock.module.css';

interface TitleBlockProps {
  readonly place: Place;
  readonly head: SheetHead;
  readonly type: string;
}

export function TitleBlock({ head, type, place }: TitleBlockProps) {
  const { printedOn } = use(SheetContext);
  return (
    <footer className={styles.block}>
      {place.sheet === 1 && (
        <>
          <Signed role={words.prepared} name={head.preparedBy} />
          <Signed role={words.checked} name={head.checkedBy} />
          <Signed role={words.approved} name="" />
        </>
      )}
      <Field area={styles.project} label={words.project} text={head.project} />
      <Field area={styles.title} label={words.title} text={[head.tag, head.service].filter(Boolean).join(', ')} />
      <Field area={styles.type} label={words.type} text={type} />
      <Field area={styles.identification} label={words.identification} text={head.tag} />
      <Field area={styles.revision} label={words.revision} text={head.revision} />
      <Field area={styles.issued} label={words.issued} text="" />
      <Field area={styles.printed} label={words.printed} text={printedOn} />
      <Field area={styles.sheet} label={words.sheet} text={sheetOf(place)} />
      <Field area={styles.status} label={words.status} text={head.status} />
    </footer>
  );
}

function Field({
  area,
  label,
  text,
}: {
  readonly area: string | undefined;
  readonly label: string;
  readonly text: string;
}) {
  return (
    <div className={area}>
      <span>{label}</span>
      <b>{text}</b>
    </div>
  );
}

/** A name, a date and a signature; what is not known is left to be written. */
function Signed({ role, name }: { readonly role: string; readonly name: string }) {
  return (
    <div className={styles.signed}>
      <div>
        <span>{role}</span>
        <b>{name}</b>
      </div>
      <div>
        <span>{words.date}</span>
      </div>
      <div>
        <span>{words.signature}</span>
      </div>
    </div>
  );
}
