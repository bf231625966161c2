import { EmptyState } from './empty-state';
import { LinkButton } from './link-button';

interface NotAllowedProps {
  title: string;
  /** Who may. */
  children: string;
  back: { readonly label: string; readonly to: string };
}

/** In place of a form that this person could fill in but not save. */
export function NotAllowed({ title, children, back }: NotAllowedProps) {
  return (
    <EmptyState title={title} action={<LinkButton to={back.to}>{back.label}</LinkButton>}>
      {children}
    </EmptyState>
  );
}
