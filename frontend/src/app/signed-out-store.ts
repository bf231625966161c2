/** Whether the session lapsed while somebody was working; a tiny store so that the query client can set it. */
type Listener = () => void;

let signedOut = false;
const listeners = new Set<Listener>();

export const signedOutStore = {
  get: (): boolean => signedOut,
  set: (value: boolean): void => {
    if (signedOut === value) return;
    signedOut = value;
    listeners.forEach((listener) => listener());
  },
  subscribe: (listener: Listener): Listener => {
    listeners.add(listener);
    return () => listeners.delete(listener);
  },
};
