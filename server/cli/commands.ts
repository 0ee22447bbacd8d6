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
  analyse: {
    usage: 'analyse FILE [--conditions]',
    what: 'impedance, peaks and headroom of a rail document; status 1 when it does not hold',
    load: () => import('./analyse'),
  },
  search: {
    usage: 'search FILE [--seconds N]',
    what: 'the smallest bank for a rail document, with its proof',
    load: () => import('./search'),
  },
  step: {
    usage: 'step FILE [--conditions]',
    what: 'voltage, droop and overshoot after the load step of a rail document',
    load: () => import('./step'),
  },
  schema: { usage: 'schema', what: 'the rail document as JSON Schema', load: () => import('./schema') },
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
