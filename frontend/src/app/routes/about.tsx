import { useQuery } from '@tanstack/react-query';

import { Page } from '../../components/page';
import { PageHeader } from '../../components/page-header';
import { sessionQuery } from '../../features/session/queries';
import styles from './about.module.css';

export function Component() {
  const { data: session } = useQuery(sessionQuery());
  return (
    <Page>
      <PageHeader title="About Bandledger" trail={[{ label: 'Desk', to: '/' }, { label: 'About' }]} />
      <div className={styles.text}>
        <p>
          Bandledger keeps the gain-bandwidth budget of amplifier chains: what every device has, what its stage spends
          at the frequency it works at, what is left, and what the part costs.
          {session && ` Version ${session.version}.`}
        </p>
        <h2>Cautions</h2>
        <ul>
          <li>
            A budget is arithmetic on datasheet values. It is no measurement: build a prototype and measure it before
            release.
          </li>
          <li>
            Radiated emission and immunity can only be shown by an accredited test. Rules on size against wavelength are
            common practice and no proof.
          </li>
          <li>
            Equipment that transmits, is medical or safety-related, or is connected to mains or high voltage has to meet
            its applicable standards and the local rules, and needs qualified engineers.
          </li>
        </ul>
        <h2>How figures are to be read</h2>
        <ul>
          <li>Verdicts are judged at the GBW case of the project’s policy, minimum unless the team sets another.</li>
          <li>A value that a datasheet does not give is never guessed: what depends on it is unknown, not clear.</li>
          <li>“~” beside a figure means that a value was assumed; its working says which.</li>
        </ul>
      </div>
    </Page>
  );
}
