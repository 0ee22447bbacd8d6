import type { SpecBinding } from './spec-binding';
import { QuantityField } from './spec-fields';

/** A regulator whose loop runs out of bandwidth, then its damping: what each element stands for. */
export function DampedFields({ bind }: { bind: SpecBinding }) {
  return (
    <>
      <QuantityField
        bind={bind}
        field="seriesResistance"
        label="R0, in series"
        unit="Ω"
        hint="Copper and pins between regulator and rail, at every frequency. Empty: 0."
      />
      <QuantityField
        bind={bind}
        field="seriesInductance"
        label="L0, in series"
        unit="H"
        hint="The loop of that path: it rules at the top of the band. Empty: 0."
      />
      <QuantityField
        bind={bind}
        field="inductorResistance"
        label="RL, of the inductor"
        unit="Ω"
        hint="What the closed loop leaves at DC, besides R0. Empty: 0."
      />
      <QuantityField
        bind={bind}
        field="inductorInductance"
        label="L, the inductor"
        unit="H"
        hint="The rise while the loop runs out of gain."
      />
      <QuantityField
        bind={bind}
        field="dampingResistance"
        label="R1, damping"
        unit="Ω"
        hint="Where that rise ends: from R1 ÷ (2πL) on R0 + R1 are seen."
      />
      <QuantityField
        bind={bind}
        field="dampingInductance"
        label="L1, in the damping"
        unit="H"
        hint="Lets it rise again at high frequencies. Empty: 0."
      />
    </>
  );
}
