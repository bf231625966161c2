import { Page } from '../../components/page';
import { PageHeader } from '../../components/page-header';
import { NewProjectForm } from '../../features/projects/components/new-project-form';

export function Component() {
  return (
    <Page>
      <PageHeader title="New project" trail={[{ label: 'Projects', to: '/projects' }, { label: 'New' }]} />
      <NewProjectForm />
    </Page>
  );
}
