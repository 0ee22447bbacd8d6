import { EngineError } from '@shared/engine/errors';
import { compileRail } from '@shared/engine/rail';
import { loadStep } from '@shared/engine/time/load-step';
import { poleForm } from '@shared/engine/time/pole-form';
import { loadStepOf } from '@shared/rail/allowance';
import { IN_SERVICE } from '@shared/rail/corner';
import { documentIn } from '@shared/rail/in-service';
import { networkOf } from '@shared/rail/network';
import type { RailDocument } from '@shared/schemas/rail-document.schema';
import { oneFile, readArguments } from './arguments';
import { onDocument, printJson, readDocument } from './document';

/**
 * The rail's voltage after its load step, with its parts' numbers as they stand (`--conditions`: in service): droop and overshoot
 * about the settled voltage before the step, times from the start of the rise.
 */
export async function run(args: string[]): Promise<number> {
  const { values, positionals } = readArguments(args, { conditions: { type: 'boolean' } });
  const file = oneFile(positionals, 'step');
  const document = await readDocument(file);
  const answer = onDocument(file, () =>
    stepOf(values.conditions ? documentIn(document, IN_SERVICE) : document),
  );
  await printJson(answer);
  return 0;
}

function stepOf(document: RailDocument) {
  const load = loadStepOf(document.rail);
  if (!load) throw new EngineError('rail.load_step', 'the document says no load step, nor does its target');
  const form = poleForm(compileRail(networkOf(document)));
  const step = loadStep(form, load.step, document.rail.voltage_V);
  return {
    droop_V: step.droop_V,
    droop_time_s: step.droop_time_s,
    overshoot_V: step.overshoot_V,
    time_s: Array.from(step.time_s),
    voltage_V: Array.from(step.voltage_V),
    // Only where there is something to say: the step that the target's own stands in for, tables that a series R–L–C stands in for.
    ...(load.assumed && { assumed_load_step: load.step }),
    ...(form.approximated.length > 0 && { approximated: form.approximated }),
  };
}
