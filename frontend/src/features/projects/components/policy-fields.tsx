import type { GbwCase, Policy } from '../../../api/types';
import { QuantityInput } from '../../../components/quantity-input';
import { SelectField } from '../../../components/select-field';
import { CASE_LABELS, POLICY_GROUPS, type PolicyField } from '../lib/policy-fields';
import type { ProjectProblems } from '../lib/project-draft';
import styles from './project-form.module.css';

const CASES = Object.entries(CASE_LABELS).map(([value, label]) => ({ value: value as GbwCase, label }));

interface PolicyFieldsProps {
  policy: Policy;
  onChange: (policy: Policy) => void;
  problems: ProjectProblems;
  /** Only leads set a policy; everybody sees it. */
  disabled: boolean;
}

const round = (value: number): number => Number(value.toPrecision(12));

export function PolicyFields({ policy, onChange, problems, disabled }: PolicyFieldsProps) {
  const set = (field: PolicyField, value: number | null): void => {
    if (value !== null) onChange({ ...policy, [field.key]: round(value / field.factor) });
  };
  return (
    <>
      <div className={styles.grid}>
        <SelectField
          label="Verdicts are given for"
          className={styles.wide}
          value={policy.gbwCase}
          options={CASES}
          disabled={disabled}
          error={problems['policy.gbwCase']}
          onChange={(gbwCase) => onChange({ ...policy, gbwCase })}
        />
      </div>
      {POLICY_GROUPS.map(({ title, fields }) => (
        <fieldset key={title} className={styles.group}>
          <legend>{title}</legend>
          <div className={styles.grid}>
            {fields.map((field) => (
              <QuantityInput
                key={field.key}
                label={field.label}
                unit={field.unit}
                suffix={field.suffix}
                minimum={field.minimum}
                maximum={field.maximum}
                required
                quietRequired
                disabled={disabled}
                value={round(policy[field.key] * field.factor)}
                error={problems[`policy.${field.key}`]}
                hint={field.hint}
                onChange={(value) => set(field, value)}
              />
            ))}
          </div>
        </fieldset>
      ))}
    </>
  );
}
