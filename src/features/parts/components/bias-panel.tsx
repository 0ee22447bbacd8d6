import { formatQuantity } from '@shared/units/format';
import { parseQuantity } from '@shared/units/parse';
import { useMemo } from 'react';
import { controlStep } from '../lib/axis-places';
import { biasCurves } from '../lib/capacitance-curves';
import { overBias } from '../lib/part-knowledge';
import { orRefusal } from '../lib/refusal';
import { volts } from '../lib/volts';
import { CapacitanceChart } from './capacitance-chart';
import { ConditionPanel, type ConditionPanelProps, markAt } from './condition-panel';
import { KnowledgeText } from './knowledge-text';
import { Slider } from './slider';
import { TypedValue } from './typed-value';

/** C over DC bias from nothing to the rating; the float below it is the bias. */
export function BiasPanel({ part, document, at, values, set }: ConditionPanelProps) {
  const rated_V = part.rated_voltage_V;
  // The curve does not go by the bias that is chosen, only its point does.
  const { temperature_C, age_h, capacitance } = at;
  const curve = useMemo(() => {
    const others = {
      voltage_V: 0,
      temperature_C,
      age_h,
      capacitance,
      esr: 'nominal',
      esl: 'nominal',
    } as const;
    const answer = orRefusal(() => biasCurves({ ...document, rated_voltage_V: rated_V }, others));
    return 'value' in answer ? answer.value : null;
  }, [document, rated_V, temperature_C, age_h, capacitance]);
  const value = volts(at.voltage_V);
  const reads = values ? formatQuantity(values.capacitance_F, 'F') : 'refused';
  return (
    <ConditionPanel
      title="DC bias"
      note={<KnowledgeText of={overBias(part)} />}
      typed={
        <TypedValue
          label="DC bias in volts"
          unit="V"
          value={at.voltage_V}
          write={(volt) => String(Number(volt.toPrecision(6)))}
          read={(text) => parseQuantity(text, 'V')}
          onCommit={(voltage_V) => set({ voltage_V })}
        />
      }
    >
      {curve && (
        <CapacitanceChart
          label={`Capacitance of ${part.partNumber} over DC bias up to ${volts(rated_V)}; at ${value} ${reads}`}
          curve={curve}
          catalogue_F={part.capacitance_F}
          mark={markAt(at.voltage_V, values)}
          writeX={volts}
          control={
            <Slider
              label="DC bias"
              low={0}
              high={rated_V}
              step={controlStep(rated_V)}
              value={at.voltage_V}
              text={`${value}, ${reads}`}
              className="w-full"
              onSlide={(voltage_V) => set({ voltage_V })}
            />
          }
        />
      )}
    </ConditionPanel>
  );
}
