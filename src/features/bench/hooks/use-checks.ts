import type { RailDocument } from '@shared/schemas/rail-document.schema';
import { ChecksClient } from '@workers/checks/checks.client';
import type { RailInTime, RailVerdicts } from '@workers/checks/checks.interface';
import { useEffect, useState } from 'react';

interface Asked<T> {
  /** The newest answer; stays while the next one is computed, with `current` false. */
  value: T | null;
  current: boolean;
  error: string | null;
}

export interface BenchChecks {
  verdicts: Asked<RailVerdicts>;
  inTime: Asked<RailInTime>;
}

/** An answer with what it is an answer to. */
interface Answered<T> {
  value: T | null;
  error: string | null;
  to: RailDocument | null;
}

const NOTHING = { value: null, error: null, to: null };

/** The curve comes first: checks are asked when the hand has rested for so long. */
const REST_MS = 120;

/** One worker for verdicts and one for what happens in time: neither waits for the other, and the bench for none. */
const clients = { verdicts: new ChecksClient(), inTime: new ChecksClient() };

/** Keeps the slower answers about the bank up to date. */
export function useChecks(document: RailDocument, span_Hz: readonly [number, number]): BenchChecks {
  const [verdicts, setVerdicts] = useState<Answered<RailVerdicts>>(NOTHING);
  const [inTime, setInTime] = useState<Answered<RailInTime>>(NOTHING);
  useEffect(() => {
    let wanted = true;
    const timer = setTimeout(() => {
      const request = { document, span_Hz };
      void clients.verdicts.verdicts(request).then((answer) => {
        if (wanted) setVerdicts((now) => answered(now, answer, document));
      });
      void clients.inTime.inTime(request).then((answer) => {
        if (wanted) setInTime((now) => answered(now, answer, document));
      });
    }, REST_MS);
    return () => {
      wanted = false;
      clearTimeout(timer);
    };
  }, [document, span_Hz]);
  return { verdicts: asked(verdicts, document), inTime: asked(inTime, document) };
}

function answered<T>(
  now: Answered<T>,
  answer: { status: 'done'; value: T } | { status: 'failed'; message: string } | { status: 'stale' },
  to: RailDocument,
): Answered<T> {
  if (answer.status === 'done') return { value: answer.value, error: null, to };
  if (answer.status === 'failed') return { value: null, error: answer.message, to };
  return now;
}

const asked = <T>({ value, error, to }: Answered<T>, document: RailDocument): Asked<T> => ({
  value,
  error,
  current: to === document,
});
