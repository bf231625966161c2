import { Button, Input } from 'antd';
import { useState, type FormEvent } from 'react';

import { fieldMessages } from '../../../api/api-error';
import type { DeviceDto } from '../../../api/types';
import { ConflictDialog } from '../../../components/conflict-dialog';
import { ErrorNotice } from '../../../components/error-notice';
import { focusFirstProblem } from '../../../components/form-problems';
import { LeaveGuard } from '../../../components/leave-guard';
import { TextField } from '../../../components/text-field';
import { addBreak, quoteBody, quoteDraftOf, quoteProblems, type BreakDraft, type QuoteDraft } from '../lib/quote-draft';
import { newerDevice } from '../lib/newer-device';
import { useSetQuote, useShowNewerDevice } from '../mutations';
import styles from './quote-section.module.css';

const MAXIMUM_BREAKS = 20;

export function QuoteForm({ device, onClose }: { device: DeviceDto; onClose: () => void }) {
  // As they were read when the form opened: a refetch behind it must not hide a conflict.
  const [{ initial, version }] = useState(() => ({
    initial: quoteDraftOf(device.quote),
    version: device.quoteVersion,
  }));
  const [draft, setDraft] = useState<QuoteDraft>(initial);
  const [tried, setTried] = useState(false);
  const save = useSetQuote(device.id);
  const own = quoteProblems(draft);
  const problems = { ...fieldMessages(save.error), ...(tried ? own : {}) };
  const newer = newerDevice(save.error);
  const showNewer = useShowNewerDevice();
  const takeTheirs = (theirs: DeviceDto): void => {
    showNewer(theirs);
    onClose();
  };
  const saveOver = (of: number): void => save.mutate({ quote: quoteBody(draft), version: of }, { onSuccess: onClose });
  const submit = (event: FormEvent<HTMLFormElement>): void => {
    event.preventDefault();
    setTried(true);
    if (focusFirstProblem(event.currentTarget, Object.keys(own).length > 0)) return;
    saveOver(version);
  };
  return (
    <form className={styles.form} onSubmit={submit} noValidate aria-label="Quote">
      <LeaveGuard when={draft !== initial && !save.isPending} />
      <ConflictDialog
        open={newer !== null}
        what={`The quote of ${device.partNumber}`}
        saving={save.isPending}
        onKeepMine={() => newer && saveOver(newer.quoteVersion)}
        onTakeTheirs={() => newer && takeTheirs(newer)}
        onClose={() => save.reset()}
      />
      <BreakLines draft={draft} onChange={setDraft} problems={problems} />
      <QuoteDetails draft={draft} onChange={setDraft} problems={problems} />
      <ErrorNotice error={newer ? null : save.error} title="The quote was not saved." />
      <div className={styles.buttons}>
        <Button type="primary" htmlType="submit" loading={save.isPending}>
          Save the quote
        </Button>
        <Button onClick={onClose}>Cancel</Button>
      </div>
    </form>
  );
}

interface PartProps {
  draft: QuoteDraft;
  onChange: (draft: QuoteDraft) => void;
  problems: Readonly<Record<string, string>>;
}

function QuoteDetails({ draft, onChange, problems }: PartProps) {
  return (
    <div className={styles.details}>
      <TextField
        label="Currency"
        required
        value={draft.currency}
        maxLength={3}
        error={problems['currency']}
        onChange={(currency) => onChange({ ...draft, currency: currency.toUpperCase() })}
      />
      <TextField
        label="Supplier"
        value={draft.supplier}
        maxLength={120}
        error={problems['supplier']}
        onChange={(supplier) => onChange({ ...draft, supplier })}
      />
      <TextField
        label="Quote number"
        value={draft.reference}
        maxLength={120}
        error={problems['reference']}
        onChange={(reference) => onChange({ ...draft, reference })}
      />
      <TextField
        label="Valid until"
        type="date"
        value={draft.validUntil}
        error={problems['validUntil']}
        onChange={(validUntil) => onChange({ ...draft, validUntil })}
      />
    </div>
  );
}

function BreakLines({ draft, onChange, problems }: PartProps) {
  const replace = (index: number, step: BreakDraft): void =>
    onChange({ ...draft, breaks: draft.breaks.map((each, at) => (at === index ? step : each)) });
  const remove = (index: number): void =>
    onChange({ ...draft, breaks: draft.breaks.filter((_step, at) => at !== index) });
  return (
    <fieldset className={styles.lines}>
      <legend>Price breaks: from how many pieces on, price of one</legend>
      {draft.breaks.map((step, index) => (
        <div key={step.id} className={styles.line}>
          <LineInput
            label={`Line ${index + 1}, from pieces`}
            value={step.quantity}
            suffix="pieces"
            error={problems[`breaks.${index}.quantity`]}
            onChange={(quantity) => replace(index, { ...step, quantity })}
          />
          <LineInput
            label={`Line ${index + 1}, price of one`}
            value={step.price}
            suffix={draft.currency}
            error={problems[`breaks.${index}.unitPriceMicros`]}
            onChange={(price) => replace(index, { ...step, price })}
          />
          <Button
            type="text"
            disabled={draft.breaks.length === 1}
            aria-label={`Remove line ${index + 1}`}
            onClick={() => remove(index)}
          >
            Remove
          </Button>
        </div>
      ))}
      <Button size="small" disabled={draft.breaks.length >= MAXIMUM_BREAKS} onClick={() => onChange(addBreak(draft))}>
        Add a break
      </Button>
      {problems['breaks'] && (
        <div className={styles.error} role="alert">
          {problems['breaks']}
        </div>
      )}
    </fieldset>
  );
}

interface LineInputProps {
  label: string;
  value: string;
  suffix: string;
  error?: string;
  onChange: (value: string) => void;
}

function LineInput({ label, value, suffix, error, onChange }: LineInputProps) {
  return (
    <div>
      <Input
        value={value}
        aria-label={label}
        aria-invalid={error ? true : undefined}
        status={error ? 'error' : undefined}
        suffix={<span className="soft">{suffix}</span>}
        autoComplete="off"
        onChange={(event) => onChange(event.target.value)}
      />
      {error && (
        <div className={styles.error} role="alert">
          {error}
        </div>
      )}
    </div>
  );
}
