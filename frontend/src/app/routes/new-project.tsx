import { NotAllowed } from '../../components/not-allowed';
import { Page } from '../../components/page';
import { PageHeader } from '../../components/page-header';
import { useHasRole } from '../../components/session-context';
import { NewProjectForm } from '../../features/projects/components/new-project-form';

export function Component() {
  const mayCreate = useHasRole('designer', 'lead');
  return (
    <Page>
      <PageHeader title="New project" trail={[{ label: 'Projects', to: '/projects' }, { label: 'New' }]} />
      {mayCreate ? (
        <NewProjectForm />
      ) : (
        <NotAllowed title="You may not create projects" back={{ label: 'Back to the projects', to: '/projects' }}>
          Projects are created by designers and leads.
        </NotAllowed>
      )}
    </Page>
  );
}
