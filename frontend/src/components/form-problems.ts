/** Fields whose text cannot be read mark themselves with this attribute: see QuantityInput. */
const UNREADABLE = '[data-unreadable="true"]';

/** Moves to the first field that cannot be read or that the form complains about; false = there is none. */
export function focusFirstProblem(form: HTMLFormElement, hasProblems: boolean): boolean {
  const unreadable = form.querySelector<HTMLElement>(UNREADABLE);
  if (!unreadable && !hasProblems) return false;
  // The messages of this submit are drawn first; then the field exists with aria-invalid.
  requestAnimationFrame(() =>
    (form.querySelector<HTMLElement>(`${UNREADABLE}, [aria-invalid="true"]`) ?? form).focus(),
  );
  return true;
}
