/** What must hold of anything that is put into the engine: a list of faults or a sound analysis, the same bytes again. */
import type { Building } from '@groundward/engine/building/definition';
import { readBuildingText } from '@groundward/engine/building/read';
import { analyse } from '@groundward/engine/path/analyse';

export type Answer = 'unread' | 'refused' | 'analysed';

/**
 * @param times how often a building that can be read is analysed, each time to the same bytes
 * @throws Error that says what is unsound, with the file
 */
export function soundAnswer(text: string, times: 1 | 2): Answer {
  try {
    const read = readBuildingText(text);
    if (!read.ok) {
      expectFaults(read.faults);
      return 'unread';
    }
    const [answer, bytes] = answerOf(read.value);
    if (times === 2 && answerOf(read.value)[1] !== bytes) throw new Error('other bytes on repetition');
    return answer;
  } catch (error) {
    const file = text.length > 4000 ? `${text.slice(0, 4000)} … (${text.length} characters)` : text;
    throw new Error(`${(error as Error).message}: ${file}`, { cause: error });
  }
}

function answerOf(building: Building): readonly [Answer, string] {
  const result = analyse(building);
  if (!result.ok) {
    expectFaults(result.faults);
    return ['refused', JSON.stringify(result.faults)];
  }
  const { certificate, demands } = result.value;
  if (!(certificate.worstResidual <= certificate.bound)) throw new Error(`residual ${certificate.worstResidual}`);
  const infinite = demands.find(({ value }) => !Number.isFinite(value));
  if (infinite !== undefined) throw new Error(`${infinite.member} ${infinite.quantity} is ${infinite.value}`);
  const bytes = JSON.stringify(result.value);
  if (/:null[,}]|\[null/.test(bytes)) throw new Error('a number that is none in the analysis');
  return ['analysed', bytes];
}

function expectFaults(faults: readonly { code: string; path: string; found: string; expected: string }[]): void {
  if (faults.length === 0) throw new Error('refused without a fault');
  for (const { code, path, found, expected } of faults) {
    if (code === '' || found === '' || expected === '' || typeof path !== 'string')
      throw new Error(`fault ${code} says nothing`);
  }
}
