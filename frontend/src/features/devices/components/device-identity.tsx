import type { DeviceKind, Grade, Lifecycle } from '../../../api/types';
import { QuantityInput } from '../../../components/quantity-input';
import { SelectField } from '../../../components/select-field';
import { TextField } from '../../../components/text-field';
import type { DeviceDraft } from '../lib/device-draft';
import { GRADE_LABELS, KIND_LABELS, LIFECYCLE_LABELS } from '../lib/device-filters';
import styles from './device-form.module.css';

interface DeviceIdentityProps {
  draft: DeviceDraft;
  onChange: (draft: DeviceDraft) => void;
  problems: Readonly<Record<string, string>>;
  /** The kind of a saved device stays: stages are built on it. */
  kindFixed: boolean;
}

const optionsOf = <T extends string>(labels: Readonly<Record<T, string>>): { value: T; label: string }[] =>
  (Object.keys(labels) as T[]).map((value) => ({ value, label: labels[value] }));

const KIND_HINTS: Readonly<Record<DeviceKind, string>> = {
  'voltage-feedback': 'An operational amplifier with a gain-bandwidth product.',
  'current-feedback': 'It has no gain-bandwidth product: bandwidth follows from its feedback resistor.',
  'matched-block': 'RF amplifier, attenuator, filter or cable between matched impedances.',
};

export function DeviceIdentity({ draft, onChange, problems, kindFixed }: DeviceIdentityProps) {
  return (
    <div className={styles.identity}>
      <SelectField<DeviceKind>
        label="Kind"
        className={styles.wide}
        value={draft.kind}
        options={optionsOf(KIND_LABELS)}
        disabled={kindFixed}
        hint={kindFixed ? 'The kind of a saved device stays; duplicate it to change it.' : KIND_HINTS[draft.kind]}
        onChange={(kind) => onChange({ ...draft, kind })}
      />
      <TextField
        label="Part number"
        required
        value={draft.partNumber}
        maxLength={60}
        hint="The exact orderable one."
        error={problems['partNumber']}
        onChange={(partNumber) => onChange({ ...draft, partNumber })}
      />
      <TextField
        label="Maker"
        value={draft.maker}
        maxLength={120}
        error={problems['maker']}
        onChange={(maker) => onChange({ ...draft, maker })}
      />
      <SelectField<Grade>
        label="Grade"
        value={draft.grade}
        options={optionsOf(GRADE_LABELS)}
        hint="RF marks the dear parts in the cost column."
        onChange={(grade) => onChange({ ...draft, grade })}
      />
      <TextField
        label="Package"
        value={draft.package}
        maxLength={120}
        error={problems['package']}
        onChange={(value) => onChange({ ...draft, package: value })}
      />
      <QuantityInput
        label="In one package"
        required
        unit="pieces"
        suffix="channels"
        minimum={1}
        maximum={64}
        value={draft.channels}
        error={problems['channels']}
        onChange={(channels) => onChange({ ...draft, channels })}
      />
      <OriginFields draft={draft} onChange={onChange} problems={problems} />
    </div>
  );
}

/** Where the values are from and how long the part will be there. */
function OriginFields({ draft, onChange, problems }: Omit<DeviceIdentityProps, 'kindFixed'>) {
  return (
    <>
      <SelectField<Lifecycle>
        label="Lifecycle"
        value={draft.lifecycle}
        options={optionsOf(LIFECYCLE_LABELS)}
        emptyLabel="Not looked up"
        onEmpty={() => onChange({ ...draft, lifecycle: '' })}
        onChange={(lifecycle) => onChange({ ...draft, lifecycle })}
      />
      <TextField
        label="Looked up on"
        type="date"
        value={draft.lifecycleDate}
        error={problems['lifecycleDate']}
        onChange={(lifecycleDate) => onChange({ ...draft, lifecycleDate })}
      />
      <TextField
        label="Datasheet revision or date"
        value={draft.datasheetRevision}
        maxLength={120}
        error={problems['datasheet.revision']}
        onChange={(datasheetRevision) => onChange({ ...draft, datasheetRevision })}
      />
      <TextField
        label="Datasheet title"
        value={draft.datasheetTitle}
        maxLength={120}
        error={problems['datasheet.title']}
        onChange={(datasheetTitle) => onChange({ ...draft, datasheetTitle })}
      />
    </>
  );
}
