import type { ServiceValues } from '@shared/engine/service/in-service';
import { inService } from '@shared/engine/service/in-service';
import { documentPart } from '@shared/rail/document';
import type { Part } from '@shared/schemas/part.schema';
import { useMemo, useState } from 'react';
import { Notice } from '@/components/ui/notice';
import { Section } from '@/components/ui/page';
import { factorChain } from '../lib/factor-chain';
import { eslSpread, esrSpread } from '../lib/part-knowledge';
import { orRefusal } from '../lib/refusal';
import { CATALOGUE, type Situation, usualSituation } from '../lib/situation';
import { AgeChoice } from './age-choice';
import { BiasPanel } from './bias-panel';
import { CurveKey } from './curve-key';
import { EndsChoice } from './ends-choice';
import { FactorChainLine } from './factor-chain';
import { ParasiticLine } from './parasitic-line';
import { PartChart } from './part-chart';
import { TemperaturePanel } from './temperature-panel';

/** What the part is where one chooses: curves with a float to drag, the chain of factors, and what it makes of |Z|. */
export function InService({ part }: { part: Part }) {
  const [at, setAt] = useState<Situation>(() => usualSituation(part));
  const set = (change: Partial<Situation>) => setAt((before) => ({ ...before, ...change }));
  const document = useMemo(() => documentPart(part), [part]);
  const answer = orRefusal(() => inService(document, at));
  const values = 'value' in answer ? answer.value : null;
  const panel = { part, document, at, values, set };
  return (
    <>
      <section>
        <div className="mb-2 flex flex-wrap items-baseline justify-between gap-x-6">
          <h2 className="section-head">in service: capacitance over bias and temperature</h2>
          <button
            type="button"
            className="text-deep underline-offset-4 hover:underline"
            onClick={() => setAt(CATALOGUE)}
          >
            as in the catalogue
          </button>
        </div>
        <div className="grid gap-x-8 gap-y-6 lg:grid-cols-2">
          <BiasPanel {...panel} />
          <TemperaturePanel {...panel} />
        </div>
        <CurveKey />
        <div className="mt-4 flex flex-wrap items-start gap-x-8 gap-y-4 border-t pt-4">
          <AgeChoice age_h={at.age_h} onChoose={(age_h) => set({ age_h })} />
          <EndsChoice
            label="capacitance"
            value={at.capacitance}
            onChoose={(capacitance) => set({ capacitance })}
          />
          <EndsChoice label="ESR" value={at.esr} onChoose={(esr) => set({ esr })} />
          <EndsChoice label="ESL" value={at.esl} onChoose={(esl) => set({ esl })} />
        </div>
        <div className="mt-4 border-y py-4">
          {'refusal' in answer ? (
            <Notice tone="error" title="▲ not in service">
              {answer.refusal}
            </Notice>
          ) : (
            <Chain part={part} at={at} values={answer.value} />
          )}
        </div>
      </section>
      <Section title="impedance over frequency">
        <PartChart part={part} document={document} at={at} values={values} />
      </Section>
    </>
  );
}

function Chain({ part, at, values }: { part: Part; at: Situation; values: ServiceValues }) {
  return (
    <div className="flex flex-col gap-3">
      <FactorChainLine
        chain={factorChain(documentPart(part), at, values)}
        estimated={values.factors.some((one) => one.estimated)}
      />
      <ParasiticLine
        name="ESR"
        unit="Ω"
        catalogue={part.esr_ohm}
        factor={values.esr_factor}
        result={values.esr_ohm}
        spread={esrSpread(part)}
      />
      <ParasiticLine
        name="ESL"
        unit="H"
        catalogue={part.esl_H}
        factor={values.esl_factor}
        result={values.esl_H}
        spread={eslSpread(part)}
      />
    </div>
  );
}
