import Segmented from 'antd/es/segmented';
import { Link } from 'react-router-dom';

import { GBW_CASES, type GbwCase } from '../../../../api/types';
import { SECTIONS, type Section } from '../../lib/workspace-url';
import { useWorkspace } from '../workspace-context';
import styles from './frame.module.css';

const SECTION_NAMES: Readonly<Record<Section, string>> = { ledger: 'Ledger', response: 'Response' };

export const CASE_NAMES: Readonly<Record<GbwCase, string>> = {
  typical: 'typical',
  minimum: 'minimum',
  minimumHot: 'minimum, hot',
};

export function SectionBar() {
  const { address, gbwCase, preview, chain } = useWorkspace();
  const projectCase = preview.report?.gbwCase ?? chain.policy.gbwCase;
  return (
    <div className={styles.sections}>
      <nav className={styles.sectionLinks} aria-label="Sections">
        {SECTIONS.map((section) => (
          <Link
            key={section}
            to={address.linkTo(section)}
            className={`${styles.section} ${section === address.section ? styles.sectionCurrent : ''}`}
            aria-current={section === address.section ? 'page' : undefined}
          >
            {SECTION_NAMES[section]}
          </Link>
        ))}
      </nav>
      <div className={styles.caseSwitch}>
        {gbwCase !== projectCase && (
          <span className="soft" role="status">
            Figures for {CASE_NAMES[gbwCase]}; verdicts stay on {CASE_NAMES[projectCase]}.
          </span>
        )}
        <Segmented<GbwCase>
          size="small"
          className={styles.segmented}
          aria-label="GBW case of the figures"
          value={gbwCase}
          onChange={(value) => address.change({ gbwCase: value === projectCase ? null : value })}
          options={GBW_CASES.map((value) => ({ value, label: CASE_NAMES[value] }))}
        />
      </div>
    </div>
  );
}
