import type { BoardSetup } from '@shared/schemas/board-setup.schema';
import type { SpecErrors, SpecForm } from '../lib/spec-form';

/** What each field of the form needs: the typed text, what is wrong with it, how to change it. */
export interface SpecBinding {
  form: SpecForm;
  /** The same a moment later, for what takes long to draw. */
  settled: SpecForm;
  /** What is said at the fields: faults of the last try to save. */
  errors: SpecErrors;
  /** What a try would say now. */
  live: SpecErrors;
  set: (patch: Partial<SpecForm>) => void;
  /** The board that the rail is on. */
  boardId: string;
  setup: BoardSetup;
}
