import { Button } from 'antd';
import { useState, type FormEvent } from 'react';

import { fieldMessages, isApiError } from '../../../api/api-error';
import type { DeviceDto } from '../../../api/types';
import { ConflictDialog } from '../../../components/conflict-dialog';
import { ErrorNotice } from '../../../components/error-notice';
import { focusFirstProblem } from '../../../components/form-problems';
import { LeaveGuard } from '../../../components/leave-guard';
import { LinkButton } from '../../../components/link-button';
import { Section } from '../../../components/section';
import { TextField } from '../../../components/text-field';
import { deviceProblems, draftOf, type DeviceDraft } from '../lib/device-draft';
import { FIELD_GROUPS } from '../lib/device-fields';
import type { DeviceFieldGroup } from '../lib/device-field';
import { NumberRow, SheetRow } from './datasheet-row';
import styles from './device-form.module.css';
import { DeviceIdentity } from './device-identity';

interface DeviceFormProps {
  initial: DeviceDraft;
  kindFixed: boolean;
  submitLabel: string;
  cancelTo: string;
  saving: boolean;
  saved: boolean;
  error: unknown;
  onSubmit: (draft: DeviceDraft) => void;
  /** After a stale save: again on the newer version. */
  onSaveOver?: (draft: DeviceDraft, newer: DeviceDto) => void;
  onTakeTheirs?: (newer: DeviceDto) => void;
  onCloseConflict?: () => void;
}

function newerDevice(error: unknown): DeviceDto | null {
  return isApiError(error) && error.isStale ? ((error.details.current as DeviceDto | undefined) ?? null) : null;
}

/** Copies a datasheet: identity, then the values group by group as datasheets print them. */
export function DeviceForm(props: DeviceFormProps) {
  const { initial, saving, saved, error } = props;
  const [draft, setDraft] = useState(initial);
  const [start, setStart] = useState(initial);
  const [tried, setTried] = useState(false);
  const newer = newerDevice(error);
  const own = deviceProblems(draft);
  const problems = { ...fieldMessages(error), ...(tried ? own : {}) };
  const submit = (event: FormEvent<HTMLFormElement>): void => {
    event.preventDefault();
    setTried(true);
    if (focusFirstProblem(event.currentTarget, Object.keys(own).length > 0)) return;
    props.onSubmit(draft);
  };
  const takeTheirs = (theirs: DeviceDto): void => {
    setDraft(draftOf(theirs));
    setStart(draftOf(theirs));
    props.onTakeTheirs?.(theirs);
  };
  return (
    <form onSubmit={submit} noValidate>
      <LeaveGuard when={draft !== start && !saving && !saved} />
      <ConflictDialog
        open={newer !== null}
        what={`The device ${draft.partNumber}`}
        saving={saving}
        onKeepMine={() => newer && props.onSaveOver?.(draft, newer)}
        onTakeTheirs={() => newer && takeTheirs(newer)}
        onClose={() => props.onCloseConflict?.()}
      />
      <DeviceIdentity draft={draft} onChange={setDraft} problems={problems} kindFixed={props.kindFixed} />
      <p className={styles.guide}>
        Type values as the datasheet prints them: <kbd>75</kbd> counts in the unit shown, <kbd>1.2G</kbd> or{' '}
        <kbd>750 kHz</kbd> override it. Leave out what it does not give; under each empty row stands what is then not
        known.
      </p>
      {FIELD_GROUPS[draft.kind].map((group) => (
        <ValueGroup
          key={`${draft.kind} ${group.title}`}
          group={group}
          draft={draft}
          onChange={setDraft}
          problems={problems}
        />
      ))}
      <Section title="Notes">
        <TextField
          label="Notes for the team"
          multiline
          maxLength={4000}
          value={draft.notes}
          error={problems['notes']}
          onChange={(notes) => setDraft({ ...draft, notes })}
        />
      </Section>
      <div className={styles.actions}>
        <Button type="primary" htmlType="submit" loading={saving}>
          {props.submitLabel}
        </Button>
        <LinkButton to={props.cancelTo}>Cancel</LinkButton>
        {!newer && <ErrorNotice error={error} title="The device was not saved." />}
      </div>
    </form>
  );
}

interface ValueGroupProps {
  group: DeviceFieldGroup;
  draft: DeviceDraft;
  onChange: (draft: DeviceDraft) => void;
  problems: Readonly<Record<string, string>>;
}

function ValueGroup({ group, draft, onChange, problems }: ValueGroupProps) {
  return (
    <Section title={group.title}>
      <div className={styles.columnHeads} aria-hidden="true">
        <span>Quantity</span>
        <span>min</span>
        <span>typ</span>
        <span>max</span>
        <span>Condition</span>
        <span>Page</span>
      </div>
      {group.fields.map((field) =>
        field.columns.length > 0 ? (
          <SheetRow
            key={field.key}
            field={field}
            sheet={draft.sheets[field.key]}
            problems={problems}
            onChange={(sheet) => onChange({ ...draft, sheets: { ...draft.sheets, [field.key]: sheet } })}
          />
        ) : (
          <NumberRow
            key={field.key}
            field={field}
            value={draft.numbers[field.key] ?? null}
            problems={problems}
            onChange={(value) => onChange({ ...draft, numbers: { ...draft.numbers, [field.key]: value } })}
          />
        ),
      )}
    </Section>
  );
}
