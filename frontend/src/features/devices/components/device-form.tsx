import { Button } from 'antd';
import { useCallback, useMemo, useState, type FormEvent } from 'react';

import { fieldMessages } from '../../../api/api-error';
import type { DeviceDto } from '../../../api/types';
import { ConflictDialog } from '../../../components/conflict-dialog';
import { ErrorNotice } from '../../../components/error-notice';
import { focusFirstProblem } from '../../../components/form-problems';
import { LeaveGuard } from '../../../components/leave-guard';
import { LinkButton } from '../../../components/link-button';
import { Section } from '../../../components/section';
import { TextField } from '../../../components/text-field';
import { deviceProblems, draftOf, type DeviceDraft, type SheetDraft } from '../lib/device-draft';
import { FIELD_GROUPS } from '../lib/device-fields';
import type { DeviceFieldGroup } from '../lib/device-field';
import { newerDevice } from '../lib/newer-device';
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

type Problems = Readonly<Record<string, string>>;
type SetSheet = (key: string, sheet: SheetDraft) => void;
type SetNumber = (key: string, value: number | null) => void;

const NO_PROBLEMS: Problems = {};

/** The same object while there is nothing to complain about, so that rows can tell. */
function useShownProblems(error: unknown, own: Problems | null): Problems {
  const fromServer = useMemo(() => fieldMessages(error), [error]);
  if (own === null) return Object.keys(fromServer).length > 0 ? fromServer : NO_PROBLEMS;
  return { ...fromServer, ...own };
}

/** The draft, and setters that stay the same while rows are typed in. */
function useDeviceDraft(initial: DeviceDraft) {
  const [draft, setDraft] = useState(initial);
  const [start, setStart] = useState(initial);
  const setSheet = useCallback<SetSheet>((key, sheet) => {
    setDraft((before) => ({ ...before, sheets: { ...before.sheets, [key]: sheet } }));
  }, []);
  const setNumber = useCallback<SetNumber>((key, value) => {
    setDraft((before) => ({ ...before, numbers: { ...before.numbers, [key]: value } }));
  }, []);
  const restart = (from: DeviceDraft): void => {
    setDraft(from);
    setStart(from);
  };
  return { draft, setDraft, setSheet, setNumber, restart, dirty: draft !== start };
}

/** Copies a datasheet: identity, then the values group by group as datasheets print them. */
export function DeviceForm(props: DeviceFormProps) {
  const { saving, saved, error, onSubmit } = props;
  const { draft, setDraft, setSheet, setNumber, restart, dirty } = useDeviceDraft(props.initial);
  const [tried, setTried] = useState(false);
  const own = deviceProblems(draft);
  const problems = useShownProblems(error, tried ? own : null);
  const submit = (event: FormEvent<HTMLFormElement>): void => {
    event.preventDefault();
    setTried(true);
    if (focusFirstProblem(event.currentTarget, Object.keys(own).length > 0)) return;
    onSubmit(draft);
  };
  return (
    <form onSubmit={submit} noValidate>
      <LeaveGuard when={dirty && !saving && !saved} />
      <DeviceConflict form={props} draft={draft} onRestart={restart} />
      <DeviceIdentity draft={draft} onChange={setDraft} problems={problems} kindFixed={props.kindFixed} />
      <p className={styles.guide}>
        Type values as the datasheet prints them: <kbd>75</kbd> counts in the unit shown, <kbd>1.2G</kbd> or{' '}
        <kbd>750 kHz</kbd> override it. Leave out what it does not give; under each empty row stands what is then not
        known.
      </p>
      {FIELD_GROUPS[draft.kind].map((group) => (
        <ValueGroup key={`${draft.kind} ${group.title}`} {...{ group, draft, problems, setSheet, setNumber }} />
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
        <ErrorNotice error={newerDevice(error) ? null : error} title="The device was not saved." />
      </div>
    </form>
  );
}

interface DeviceConflictProps {
  form: DeviceFormProps;
  draft: DeviceDraft;
  onRestart: (from: DeviceDraft) => void;
}

/** Somebody else saved in between: theirs or mine. */
function DeviceConflict({ form, draft, onRestart }: DeviceConflictProps) {
  const newer = newerDevice(form.error);
  const takeTheirs = (theirs: DeviceDto): void => {
    onRestart(draftOf(theirs));
    form.onTakeTheirs?.(theirs);
  };
  return (
    <ConflictDialog
      open={newer !== null}
      what={`The device ${draft.partNumber}`}
      saving={form.saving}
      onKeepMine={() => newer && form.onSaveOver?.(draft, newer)}
      onTakeTheirs={() => newer && takeTheirs(newer)}
      onClose={() => form.onCloseConflict?.()}
    />
  );
}

interface ValueGroupProps {
  group: DeviceFieldGroup;
  draft: DeviceDraft;
  problems: Problems;
  setSheet: SetSheet;
  setNumber: SetNumber;
}

function ValueGroup({ group, draft, problems, setSheet, setNumber }: ValueGroupProps) {
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
            onChange={setSheet}
          />
        ) : (
          <NumberRow
            key={field.key}
            field={field}
            value={draft.numbers[field.key] ?? null}
            problems={problems}
            onChange={setNumber}
          />
        ),
      )}
    </Section>
  );
}
