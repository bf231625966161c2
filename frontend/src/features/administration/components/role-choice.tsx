import type { Role } from '../../../api/types';
import { ROLES, toggleRole } from '../lib/roles';
import styles from './people.module.css';

interface RoleChoiceProps {
  roles: readonly Role[];
  onChange: (roles: readonly Role[]) => void;
  error?: string | null;
}

export function RoleChoice({ roles, onChange, error }: RoleChoiceProps) {
  return (
    <fieldset className={styles.roles}>
      <legend>Roles (at least one)</legend>
      {ROLES.map(({ role, does }) => (
        <label key={role}>
          <input
            type="checkbox"
            checked={roles.includes(role)}
            aria-invalid={error ? true : undefined}
            onChange={() => onChange(toggleRole(roles, role))}
          />{' '}
          <strong>{role}</strong> <span className="soft">{does}</span>
        </label>
      ))}
      {error && (
        <div className={styles.error} role="alert">
          {error}
        </div>
      )}
    </fieldset>
  );
}
