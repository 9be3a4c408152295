import type { Flux } from '@merestone/engine';
import { Figure } from '../../../shared/ui/figure';
import { Mark } from './mark';

/** The flux from the interface into the bulk, with the cautions that belong to it. */
export function FluxLine({ flux, mark }: { flux: Flux; mark: string | null }) {
  return (
    <div>
      <p className="flux-number">
        Flux from interface to bulk = <Figure value={flux.value} unit={flux.unit} /> <Mark words={mark} />
      </p>
      {flux.warnings.map((warning) => (
        <p key={warning}>{warning}</p>
      ))}
    </div>
  );
}
