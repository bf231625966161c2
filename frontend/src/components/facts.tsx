import styles from './facts.module.css';

interface FactsProps {
  /** Term and text, in the order in which they are read. */
  facts: readonly (readonly [string, string])[];
  /** For texts of several words. */
  wide?: boolean;
}

/** Short facts about one thing, in as many columns as fit. */
export function Facts({ facts, wide = false }: FactsProps) {
  return (
    <dl className={`${styles.facts} ${wide ? styles.wide : ''}`}>
      {facts.map(([term, text]) => (
        <div key={term}>
          <dt>{term}</dt>
          <dd>{text}</dd>
        </div>
      ))}
    </dl>
  );
}
