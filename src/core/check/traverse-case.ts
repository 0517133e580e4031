/** What every check of a traverse looks at: the traverse as entered, as surveyed, and how good its readings are. */
import type { TraverseInput } from '../input/traverse.ts';
import type { Quality } from '../traverse/quality.ts';
import type { Survey } from '../traverse/survey.ts';

export interface TraverseCase {
  readonly input: TraverseInput;
  readonly survey: Survey;
  /** Absent until something is read. */
  readonly quality: Quality | undefined;
}
