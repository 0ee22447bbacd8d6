/** Tells the page that the session has ended, so that it can ask for the password where one is. */
type Listener = () => void;
const listeners = new Set<Listener>();

export function onSessionExpired(listener: Listener): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

export function sessionExpired(): void {
  for (const listener of listeners) listener();
}
