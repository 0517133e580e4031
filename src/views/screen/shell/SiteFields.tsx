/** Where the site lies and what it stands in; what is empty is said, and what its place suggests can be taken. */
import { SITE_DEFAULTS } from '../../../core/document/defaults.ts';
import { asPrinted } from '../../present/base.ts';
import { type Suggestion, type Suggestions, siteSuggestions } from '../../present/site.ts';
import { fieldLabel } from '../../words/fields.ts';
import { problemSentence } from '../../words/problems.ts';
import { siteWords as words } from '../../words/site.ts';
import { useWorkbench } from '../binding.tsx';
import buttons from '../button.module.css';
import { QuantityBox } from '../field/QuantityField.tsx';
import { textAt } from '../text.ts';

/** The fields in their order, each with what stands where nothing is written. */
const USUAL: Readonly<Record<string, string>> = {
  'site.altitude': '',
  'site.latitude': '',
  'site.atmosphere': SITE_DEFAULTS.atmosphere,
  'site.gravity': SITE_DEFAULTS.gravity,
  'base.pressure': SITE_DEFAULTS.basePressure,
  'base.temperature': SITE_DEFAULTS.baseTemperature,
};

export function SiteFields() {
  const project = useWorkbench((state) => state.project);
  const results = useWorkbench((state) => state.results);
  const write = useWorkbench((state) => state.writeProject);
  const refused = results.results.flatMap((result) => (result.status === 'refused' ? result.problems : []));
  const problemAt = (path: string): string | undefined => {
    const problem = refused.find(({ field }) => field === path);
    return problem && problemSentence(problem);
  };
  const suggestions: Suggestions = siteSuggestions(project, results);
  const noteOn = (path: string, usual: string, text: string) => {
    const suggestion = path === 'site.atmosphere' || path === 'site.gravity' ? suggestions[path] : undefined;
    if (suggestion !== undefined) return <Suggested path={path} text={text} suggestion={suggestion} />;
    return text === '' && usual !== '' && <span>{words.empty(asPrinted(usual))}</span>;
  };
  return Object.entries(USUAL).map(([path, usual]) => (
    <QuantityBox
      key={path}
      path={path}
      text={textAt(project, path)}
      problem={problemAt(path)}
      write={(next) => write(path, next)}
      note={noteOn(path, usual, textAt(project, path))}
    />
  ));
}

interface SuggestedProps {
  readonly path: string;
  readonly text: string;
  readonly suggestion: Suggestion;
}

/** What the place of the site suggests: in use while the field is empty, else there to be taken. */
function Suggested({ path, text, suggestion: { sentence, figure, file, taken } }: SuggestedProps) {
  const write = useWorkbench((state) => state.writeProject);
  const settle = useWorkbench((state) => state.settle);
  const take = (): void => {
    settle();
    write(path, file);
    settle();
  };
  return (
    <>
      <span>{sentence}</span>{' '}
      {!taken && text !== file && (
        <button
          type="button"
          className={buttons.word}
          aria-label={words.takeOf(fieldLabel(path), figure)}
          onClick={take}
        >
          {words.take}
        </button>
      )}
    </>
  );
}
