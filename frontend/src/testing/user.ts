import userEvent, { type UserEvent } from '@testing-library/user-event';

/** A person who types without pauses. */
export const setupUser = (): UserEvent => userEvent.setup({ delay: null });

/** Fills a field in one go, as by pasting: one change instead of one for every letter. */
export async function fill(user: UserEvent, field: HTMLElement, text: string): Promise<void> {
  await user.clear(field);
  await user.click(field);
  await user.paste(text);
}
