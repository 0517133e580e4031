/** The words on the drawing of the pipe. */
import type { PipeLabels } from '../drawing/words.ts';
import type { PresentedSizing } from '../present/model.ts';
import { openingWord } from '../words/elements.ts';

const plainAnswer = ({ answer }: PresentedSizing): string => answer.map(({ text }) => text).join('');

const capital = (word: string): string => word.charAt(0).toUpperCase() + word.slice(1);

/** Figures are those of the presented rows, so that drawing and tables spell them alike. */
export function drawingLabels(sizing: PresentedSizing): PipeLabels {
  const { shape, heads, pipe, metal } = sizing;
  const opening = openingWord(shape.element);
  const bore = metal.find(({ id }) => id === 'bore-as-measured')?.value.text ?? '';
  const ratio = metal.find(({ id }) => id === 'diameter-ratio')?.value.text ?? '';
  return {
    title: `${sizing.element} in its pipe, with the head lines above it`,
    description: `${plainAnswer(sizing)} The head falls by ${heads.tappingDrop.text} between the tappings; ${heads.loss.text} is lost permanently.`,
    totalHead: 'total head',
    pressureHead: 'pressure head',
    tappings: 'across the tappings',
    loss: 'permanent loss',
    pipe: `D ${pipe[0]?.value.text ?? ''}`,
    bore: `${opening} ${bore}`,
    recovered: `recovered by ${shape.recovery_D} D`,
    legend: 'Marked points are computed; the lines between them are drawn.',
    scale: 'Bores, tappings and distances to scale; wall and flanges are not.',
    pull: `${capital(opening)}, pull to change`,
    pullValue: `${opening} ${bore}, diameter ratio ${ratio}`,
  };
}
