/** Short paragraphs: what marks mean, the cautions of the service. */
import styles from './content.module.css';

export const Notes = ({ lines }: { readonly lines: readonly string[] }) => (
  <div className={styles.notes}>
    {lines.map((text) => (
      <p key={text}>{text}</p>
    ))}
  </div>
);
