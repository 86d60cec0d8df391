/** Working of the centre of rigidity: where a force turns nothing. */
import type { Demand } from '../path/result.js';
import { bodyOf } from './body-member.js';
import type { Context } from './context.js';
import { armStep, cosinesOf, cosineValues, joined, stiffnessStep, type Cosines } from './plan-arms.js';
import type { Steps, Value } from './steps.js';

type Spring = { readonly k: Value; readonly r: Value; readonly cosines: Cosines };

export function centreOfRigidity(axis: 'x' | 'y') {
  return (context: Context, demand: Demand, steps: Steps): void => {
    const { diaphragm, rigid } = bodyOf(context, demand);
    if (rigid === undefined) throw new Error(`${diaphragm.key} is no body`);
    const springs: Spring[] = [];
    const skew = rigid.model.springs.some(({ a }) => a[0] !== 0 && a[1] !== 0);
    for (const { line, a } of rigid.model.springs) {
      const storey = line.storeys[diaphragm.level];
      // Lines across the axis say nothing about the centre along it, unless some lines run askew.
      if (storey === undefined || (!skew && a[axis === 'x' ? 1 : 0] === 0)) continue;
      const tag = String(springs.length + 1);
      springs.push({
        k: stiffnessStep(context, storey, rigid.model.absolute, steps, tag),
        r: armStep(context, line, undefined, steps, tag),
        cosines: cosinesOf(context, line, `_${tag}`),
      });
    }
    const sums = sumsOf(springs, steps);
    const { length } = context.units;
    const clause = 'K = Σ k·a·aᵀ; a force through the centre turns nothing';
    if (skew) {
      const values = (['xx', 'yy', 'xy', 'xr', 'yr'] as const).map((name) => sums(name));
      const formula =
        axis === 'x' ? '(K_xx·K_yr − K_xy·K_xr)/(K_xx·K_yy − K_xy^2)' : '(K_xy·K_yr − K_yy·K_xr)/(K_xx·K_yy − K_xy^2)';
      steps.add(`${axis}_R`, formula, values, length, { clause });
    } else if (axis === 'x') steps.add('x_R', 'K_yr/K_yy', [sums('yr'), sums('yy')], length, { clause });
    else steps.add('y_R', '−K_xr/K_xx', [sums('xr'), sums('xx')], length, { clause });
  };
}

/** Sums over the wall lines, `r` standing for the arm about the plan's origin. */
function sumsOf(springs: readonly Spring[], steps: Steps) {
  return (name: 'xx' | 'yy' | 'xy' | 'xr' | 'yr'): Value => {
    const values: Value[] = [];
    const terms = springs.map(({ k, r, cosines }) => {
      const factors: Value[] = [k];
      let sign = 1;
      for (const letter of name) {
        if (letter === 'r') {
          factors.push(r);
          continue;
        }
        const cosine = cosines[letter as 'x' | 'y'];
        if (cosine === undefined) return '';
        sign *= cosine.sign;
        if (cosine.value !== undefined) factors.push(cosine.value);
      }
      values.push(...factors, ...cosineValues(cosines));
      return `${sign < 0 ? '−' : '+'} ${factors.map(({ symbol }) => symbol).join('·')}`;
    });
    const k = springs[0]?.k.unit ?? '1';
    return steps.add(`K_${name}`, joined(terms), values, name.endsWith('r') ? `${k}·length` : k);
  };
}
