import { isApiError } from '../../../../api/api-error';
import { ErrorNotice } from '../../../../components/error-notice';
import { useWorkspace } from '../workspace-context';
import styles from './frame.module.css';

const STAGE_PATH = /^stages\.(\d+)\./;

/** Input that cannot be computed: what is wrong, with the way to the field; the last figures stay on the screen. */
export function PreviewProblem() {
  const { preview, control, address, openSpecification } = useWorkspace();
  const { error } = preview;
  if (!error) return null;
  if (!isApiError(error, 422)) {
    return <ErrorNotice error={error} title="The figures are not up to date." onRetry={preview.retry} />;
  }
  return (
    <div className={styles.notice} role="alert">
      <div>
        <strong>These figures are from before the last change.</strong>{' '}
        {error.fieldErrors.length === 0 && error.message}
        {error.fieldErrors.map(({ path, message }) => {
          const index = Number(STAGE_PATH.exec(path)?.[1] ?? -1);
          const stage = control.draft.stages[index];
          const open = stage ? () => address.change({ stageId: stage.id }) : openSpecification;
          return (
            <button key={path + message} type="button" className={styles.problem} onClick={open}>
              {stage ? `S${index + 1} ${stage.name}: ` : ''}
              {message}
            </button>
          );
        })}
      </div>
    </div>
  );
}
