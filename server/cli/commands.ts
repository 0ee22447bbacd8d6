export interface Command {
  /** The exit status. */
  run(args: string[]): Promise<number>;
}

interface Entry {
  usage: string;
  what: string;
  load: () => Promise<Command>;
}

/** Loaded only when called, so that a command starts without the code of the others. */
export const commands: Record<string, Entry> = {
  admin: {
    usage: 'admin create [--email E --name N --password-stdin]',
    what: 'makes an administrator',
    load: () => import('./admin'),
  },
  seed: { usage: 'seed', what: 'adds what is missing of the demo data', load: () => import('./seed') },
  backup: {
    usage: 'backup FILE [--force]',
    what: 'copies the database, also while the server runs',
    load: () => import('./backup'),
  },
  restore: {
    usage: 'restore FILE',
    what: 'puts a backup in place, while the server is stopped',
    load: () => import('./restore'),
  },
  help: { usage: 'help', what: 'lists the commands', load: () => import('./help') },
};
