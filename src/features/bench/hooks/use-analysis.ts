import type { Corner } from '@shared/rail/corner';
import { documentPart } from '@shared/rail/document';
import { ownMount_H } from '@shared/rail/setup';
import type { BoardSetup } from '@shared/schemas/board-setup.schema';
import type { Part } from '@shared/schemas/part.schema';
import type { BankLine } from '@shared/schemas/rail.schema';
import type { RailSpec } from '@shared/schemas/rail-spec.schema';
import { AnalysisClient } from '@workers/analysis/analysis.client';
import type { BenchAnalysis, BenchRequest } from '@workers/analysis/analysis.interface';
import { useEffect, useMemo, useState } from 'react';

export interface AnalysisState {
  /** The newest result; stays while the next one is computed. */
  analysis: BenchAnalysis | null;
  /** Which lines it was computed for, in its own order. */
  error: { message: string; field: string | null } | null;
}

const NOTHING: AnalysisState = { analysis: null, error: null };

/** One worker a slot: the bench's own curve never waits for a preview's. */
const clients = { bench: new AnalysisClient(), preview: new AnalysisClient() };

/** Keeps the analysis of a bank up to date in its worker; the last request wins. Null lines: nothing to compute. */
export function useAnalysis(
  slot: keyof typeof clients,
  spec: RailSpec,
  lines: readonly BankLine[] | null,
  parts: ReadonlyMap<string, Part>,
  setup: BoardSetup,
  corner: Corner | null,
  span_Hz: readonly [number, number],
): AnalysisState {
  const request = useMemo<BenchRequest | null>(() => {
    if (!lines) return null;
    const bench = lines.flatMap((line) => {
      const part = parts.get(line.partId);
      if (!part) return [];
      const mount_H = ownMount_H(line, spec, setup)?.mount_H ?? null;
      return [{ part: documentPart(part), count: line.count, mount_H, distance_m: line.distance_m }];
    });
    return { spec, lines: bench, corner, span_Hz };
  }, [lines, parts, spec, setup, corner, span_Hz]);
  const [state, setState] = useState<AnalysisState>(NOTHING);
  useEffect(() => {
    if (!request) {
      setState(NOTHING);
      return;
    }
    let current = true;
    void clients[slot].analyse(request).then((answer) => {
      if (!current) return;
      if (answer.status === 'done') setState({ analysis: answer.value, error: null });
      if (answer.status === 'failed') setState({ analysis: null, error: answer });
    });
    return () => {
      current = false;
    };
  }, [request, slot]);
  return state;
}
