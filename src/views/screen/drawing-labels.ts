/** The words on the drawing of the pipe. */
import type { PipeLabels } from '../drawing/words.ts';
import type { PresentedSizing } from '../present/model.ts';
import { openingWord } from '../words/elements.ts';

const plainAnswer = ({ answer }: PresentedSizing): string => answer.map(({ text }) => text).join('');

const capital = (word: string): string => word.charAt(0).toUpperCase() + word.slice(1);

/** Figures are those of the presented rows, so that drawing and tables spell them alike. */
export const drawingLabels = (sizing: PresentedSizing): PipeLabels =>
  openingWord(sizing.shape.element) === 'none' ? barLabels(sizing) : boreLabels(sizing);

/** What the head lines say, for those who do not see them. */
function headsText({ heads }: PresentedSizing, holes: string): string {
  if (heads === undefined) return '';
  return ` The head falls by ${heads.tappingDrop.text} between the ${holes}; ${heads.loss.text} is lost permanently.`;
}

const common = {
  totalHead: 'total head',
  pressureHead: 'pressure head',
  loss: 'permanent loss',
  legend: 'Marked points are computed; the lines between them are drawn.',
} as const;

function barLabels(sizing: PresentedSizing): PipeLabels {
  const { heads, pipe, metal } = sizing;
  const coefficient = metal.find(({ id }) => id === 'coefficient')?.value.text ?? '';
  const width = metal.find(({ id }) => id === 'bar-width')?.value.text;
  return {
    ...common,
    title: `${sizing.element}, in its pipe${heads === undefined ? '' : ', with the head lines above it'}`,
    description: `${plainAnswer(sizing)}${headsText(sizing, 'ports')}`,
    tappings: 'between the ports',
    pipe: `D ${pipe[0]?.value.text ?? ''}`,
    bore: width === undefined ? `K ${coefficient}` : `K ${coefficient}, bar ${width} wide`,
    recovered: '',
    scale: 'Pipe bore to scale; wall, bar and ports are not.',
  };
}

function boreLabels(sizing: PresentedSizing): PipeLabels {
  const { shape, pipe, metal } = sizing;
  const opening = openingWord(shape.element);
  const bore = metal.find(({ id }) => id === 'bore-as-measured')?.value.text ?? '';
  const ratio = metal.find(({ id }) => id === 'diameter-ratio')?.value.text ?? '';
  return {
    ...common,
    title: `${sizing.element} in its pipe, with the head lines above it`,
    description: `${plainAnswer(sizing)}${headsText(sizing, 'tappings')}`,
    tappings: 'across the tappings',
    pipe: `D ${pipe[0]?.value.text ?? ''}`,
    bore: `${opening} ${bore}`,
    recovered: `recovered by ${shape.recovery_D} D`,
    scale: 'Bores, tappings and distances to scale; wall and flanges are not.',
    pull: `${capital(opening)}, pull to change`,
    pullValue: `${opening} ${bore}, diameter ratio ${ratio}`,
  };
}
