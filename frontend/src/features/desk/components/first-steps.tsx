import type { Desk } from '../../../api/types';
import { EmptyState } from '../../../components/empty-state';
import { LinkButton } from '../../../components/link-button';
import { useHasRole } from '../../../components/session-context';

/** The way from an empty library to the first ledger, one step at a time. */
export function FirstSteps({ counts }: { counts: Desk['counts'] }) {
  const plans = useHasRole('designer', 'lead');
  if (!plans) return <NothingToPlan counts={counts} />;
  if (counts.devices === 0) {
    return (
      <EmptyState
        title="Start with a device"
        action={
          <LinkButton to="/devices/new" type="primary">
            Enter a device
          </LinkButton>
        }
      >
        Step 1 of 3. Copy the gain-bandwidth of an amplifier from its datasheet; the other values can follow. Then make
        a project, and a chain in it.
      </EmptyState>
    );
  }
  if (counts.projects === 0) {
    return (
      <EmptyState
        title="Make a project"
        action={
          <LinkButton to="/projects/new" type="primary">
            New project
          </LinkButton>
        }
      >
        Step 2 of 3. A project holds the currency, the number of boards per build and the team’s margins.
      </EmptyState>
    );
  }
  if (counts.chains === 0) {
    return (
      <EmptyState
        title="Build a chain"
        action={
          <LinkButton to="/projects" type="primary">
            Choose a project
          </LinkButton>
        }
      >
        Step 3 of 3. Open a project and add a chain: source, load, band, requirements, then its stages.
      </EmptyState>
    );
  }
  return (
    <EmptyState title="No chain is over its limits" action={<LinkButton to="/projects">Projects</LinkButton>}>
      Chains over a limit of yours or of the team appear here first.
    </EmptyState>
  );
}

/** For those who plan no chains themselves: whoever may invite starts with the people. */
function NothingToPlan({ counts }: { counts: Desk['counts'] }) {
  const invites = useHasRole('admin');
  if (invites && counts.devices === 0) {
    return (
      <EmptyState
        title="Invite the team"
        action={
          <LinkButton to="/administration" type="primary">
            Invite people
          </LinkButton>
        }
      >
        Designers enter devices and build chains, buyers enter quotes, leads set the margins. A person may have several
        roles, you too.
      </EmptyState>
    );
  }
  return (
    <EmptyState title="Nothing waits for you">
      Chains that are over a limit appear here as soon as designers have built some.
    </EmptyState>
  );
}
