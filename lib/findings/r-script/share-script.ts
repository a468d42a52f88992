import { ENGINE_VERSION } from '../engine-version';
import { assemble } from './assemble';
import { functionsFor } from './functions';
import { rName, type InputsInR, type Labels } from './inputs';

/**
 * The script of one share of the base in `release`, or of a bloc on it.
 *
 * @param option its name
 * @param inputs what the script starts from
 * @param labels the names that options go by
 */
export function shareScript(option: string, inputs: InputsInR, labels: Labels): string {
  const name = rName(option, labels);
  return assemble({
    words: `share of ${name}`,
    engine: ENGINE_VERSION,
    functions: functionsFor([...inputs.needs, 'shareInterval', 'show']),
    sections: [
      ...inputs.sections,
      {
        title: 'Share and interval, unadjusted',
        code: `p <- proportion(release, ${name})
has_interval <- !is.na(p) && release$basis != "none"
interval <- if (has_interval) share_interval(p, release, policy$level)
method <- if (has_interval) share_method(p, release$n_eff)`,
      },
    ],
    output: [
      'show("kind", "share")',
      ...inputs.output,
      'show("estimatePct", 100 * p)',
      'show("intervalPct", if (has_interval) 100 * interval)',
      'show("method", method)',
    ].join('\n'),
  });
}
