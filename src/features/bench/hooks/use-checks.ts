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

const NOTHING = { value: null, current: false, error: null };

/** One worker for verdicts and one for what happens in time: neither waits for the other, and the bench for none. */
const clients = { verdicts: new ChecksClient(), inTime: new ChecksClient() };

/** Keeps the slower answers about the bank up to date; null: nothing to check. */
export function useChecks(document: RailDocument | null, span_Hz: readonly [number, number]): BenchChecks {
  const [verdicts, setVerdicts] = useState<Asked<RailVerdicts>>(NOTHING);
  const [inTime, setInTime] = useState<Asked<RailInTime>>(NOTHING);
  useEffect(() => {
    if (!document) {
      setVerdicts(NOTHING);
      setInTime(NOTHING);
      return;
    }
    let wanted = true;
    setVerdicts((now) => ({ ...now, current: false }));
    setInTime((now) => ({ ...now, current: false }));
    const request = { document, span_Hz };
    void clients.verdicts.verdicts(request).then((answer) => {
      if (wanted) setVerdicts((now) => asked(now, answer));
    });
    void clients.inTime.inTime(request).then((answer) => {
      if (wanted) setInTime((now) => asked(now, answer));
    });
    return () => {
      wanted = false;
    };
  }, [document, span_Hz]);
  return { verdicts, inTime };
}

function asked<T>(
  now: Asked<T>,
  answer: { status: 'done'; value: T } | { status: 'failed'; message: string } | { status: 'stale' },
): Asked<T> {
  if (answer.status === 'done') return { value: answer.value, current: true, error: null };
  if (answer.status === 'failed') return { value: null, current: true, error: answer.message };
  return now;
}
