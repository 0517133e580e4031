/** What the box of a field says about itself: whether it waits to be filled or is wrong, and where the sentence stands. */
import { useUntried } from '../meter.ts';
import { noteId, problemId } from './Frame.tsx';

interface FieldAt {
  readonly path: string;
  readonly text: string;
  readonly problem: string | undefined;
  /** Where it stands, for a field that the page may show twice. */
  readonly place?: string;
  /** Something is said below it beside a problem. */
  readonly noted?: boolean;
}

export function useFieldState({ path, text, problem, place = 'field', noted = false }: FieldAt) {
  const waiting = useUntried() && text === '';
  const invalid = problem !== undefined && !waiting;
  const id = `${place}-${path}`;
  const described = [noted ? noteId(id) : '', problem === undefined ? '' : problemId(id)].filter(Boolean).join(' ');
  return {
    /** For the frame around it. */
    frame: { id, problem, waiting },
    invalid,
    /** For the input or the list itself. */
    box: {
      id,
      'data-field': path,
      'aria-invalid': invalid,
      'aria-describedby': described === '' ? undefined : described,
    },
  };
}
