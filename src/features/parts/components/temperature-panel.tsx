import { formatQuantity, MINUS } from '@shared/units/format';
import { type Parsed, parseQuantity } from '@shared/units/parse';
import { useMemo } from 'react';
import { shownTemperatures, temperatureCurves } from '../lib/capacitance-curves';
import { overTemperature } from '../lib/part-knowledge';
import { orRefusal } from '../lib/refusal';
import { celsiusText } from '../lib/situation';
import { CapacitanceChart } from './capacitance-chart';
import { ConditionPanel, type ConditionPanelProps, markAt } from './condition-panel';
import { KnowledgeText } from './knowledge-text';
import { Slider } from './slider';
import { TypedValue } from './typed-value';

const LOWEST_C = -100;
const HIGHEST_C = 300;

/** `−40`, `85 °C`: a bare number is in °C. */
function readCelsius(text: string): Parsed {
  const parsed = parseQuantity(text.replace(/°?\s*C?\s*$/i, ''), '');
  if (!parsed.ok || (parsed.value >= LOWEST_C && parsed.value <= HIGHEST_C)) return parsed;
  return { ok: false, reason: `${celsiusText(LOWEST_C)} to ${celsiusText(HIGHEST_C)}` };
}

/** C over temperature; the float below it is the temperature. */
export function TemperaturePanel({ part, document, at, values, set }: ConditionPanelProps) {
  const [low, high] = shownTemperatures(document, at.temperature_C);
  const curve = useMemo(() => {
    const answer = orRefusal(() => temperatureCurves(document, at));
    return 'value' in answer ? answer.value : null;
  }, [document, at]);
  const value = celsiusText(at.temperature_C);
  const reads = values ? formatQuantity(values.capacitance_F, 'F') : 'refused';
  return (
    <ConditionPanel
      title="temperature"
      note={<KnowledgeText of={overTemperature(part)} />}
      typed={
        <TypedValue
          label="temperature in degrees Celsius"
          unit="°C"
          value={at.temperature_C}
          write={(celsius) => String(celsius).replace('-', MINUS)}
          read={readCelsius}
          onCommit={(temperature_C) => set({ temperature_C })}
        />
      }
    >
      {curve && (
        <CapacitanceChart
          label={`Capacitance of ${part.partNumber} over temperature; at ${value} ${reads}`}
          curve={curve}
          catalogue_F={part.capacitance_F}
          mark={markAt(at.temperature_C, values)}
          writeX={celsiusText}
          control={
            <Slider
              label="temperature"
              low={low}
              high={high}
              step={1}
              value={at.temperature_C}
              text={`${value}, ${reads}`}
              className="w-full"
              onSlide={(temperature_C) => set({ temperature_C })}
            />
          }
        />
      )}
    </ConditionPanel>
  );
}
