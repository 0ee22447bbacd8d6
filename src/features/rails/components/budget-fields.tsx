import { liveBudget } from '../lib/live';
import { BudgetBar } from './budget-bar';
import { BudgetTable } from './budget-table';
import type { SpecBinding } from './spec-binding';
import { QuantityField } from './spec-fields';

/** What the rail's tolerance is spent on, and as a bar that adds up what is left for the bank. */
export function BudgetFields({ bind }: { bind: SpecBinding }) {
  const figures = liveBudget(bind.form);
  return (
    <div className="flex flex-col gap-4">
      <div className="grid grid-cols-1 gap-4 sm:grid-cols-2 xl:grid-cols-4">
        <QuantityField
          bind={bind}
          field="tolerance"
          label="rail tolerance, ±"
          unit="%"
          hint="of the load, on the rail’s voltage"
        />
        <QuantityField bind={bind} field="setpoint" label="set-point error, ±" unit="%" hint="empty: 0" />
        <QuantityField
          bind={bind}
          field="dcDrop"
          label="DC drop"
          unit="V"
          hint="from the sense point to the load; empty: 0"
        />
        <QuantityField
          bind={bind}
          field="regulatorRipple"
          label="the regulator’s own ripple"
          unit="V"
          hint="half of peak to peak; empty: 0"
        />
      </div>
      {figures ? (
        <div className="flex flex-col gap-2">
          <BudgetBar figures={figures} />
          <BudgetTable figures={figures} />
        </div>
      ) : (
        <p className="text-small text-stone">
          Voltage and tolerance make the bar that shows what is left for the bank.
        </p>
      )}
    </div>
  );
}
