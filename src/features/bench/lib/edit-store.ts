/** Edits that could not be sent yet, in this browser, by person, board and rail: a closed page loses nothing. */
const PREFIX = 'millpond.edit.';

export interface EditPlace {
  personId: string;
  boardId: string;
  railId: string;
}

const keyOf = ({ personId, boardId, railId }: EditPlace) => `${PREFIX}${personId}.${boardId}.${railId}`;

/** Rails whose bench is open here: it sends its own edits. */
const open = new Set<string>();

/** Where one rail's edit is kept; `close` hands it over to whoever sends what is left. */
export function editStore(place: EditPlace) {
  const key = keyOf(place);
  open.add(key);
  return {
    read: () => localStorage.getItem(key),
    write: (text: string | null) =>
      text === null ? localStorage.removeItem(key) : localStorage.setItem(key, text),
    close: () => open.delete(key),
  };
}

export interface LeftEdit extends EditPlace {
  key: string;
  text: string;
}

/** Younger edits may be another window's, which is sending them. */
const LEFT_AFTER_MS = 6000;

/** Edits of this person that no open bench looks after. */
export function leftEdits(personId: string): LeftEdit[] {
  const found: LeftEdit[] = [];
  for (let i = 0; i < localStorage.length; i++) {
    const key = localStorage.key(i) ?? '';
    if (!key.startsWith(`${PREFIX}${personId}.`) || open.has(key)) continue;
    const [boardId, railId] = key.slice(`${PREFIX}${personId}.`.length).split('.');
    const text = localStorage.getItem(key);
    if (text !== null && boardId && railId && Date.now() - writtenAt(text) > LEFT_AFTER_MS)
      found.push({ key, text, personId, boardId, railId });
  }
  return found;
}

function writtenAt(text: string): number {
  try {
    return Number(JSON.parse(text).at) || 0;
  } catch {
    return 0;
  }
}

/** Forgets an edit that has been sent, unless a newer one has taken its place. */
export function forgetEdit({ key, text }: LeftEdit): void {
  if (localStorage.getItem(key) === text) localStorage.removeItem(key);
}
