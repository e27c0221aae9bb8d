import type { SetupFieldWords } from '@chargewright/wording';
import type { Choice } from './choice-group';

/** Options of the setup with their labels; `hinted`: each with its sentence. */
export const choicesOf = <Option extends string>(
  options: readonly Option[],
  words: SetupFieldWords<Option>,
  hinted?: 'hinted',
): readonly Choice<Option>[] =>
  options.map((value) => {
    const { label, hint } = words.options[value];
    return { value, label, ...(hinted && hint !== '' && { hint }) };
  });
