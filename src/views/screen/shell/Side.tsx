/** The side of the window: the meters and the surveys of the project. On a narrow screen those of the place at hand. */
import { Boundary } from '../Boundary.tsx';
import { useWorkbench } from '../binding.tsx';
import { usePlace } from '../place.ts';
import styles from './MeterList.module.css';
import { MeterList } from './MeterList.tsx';
import { SurveyList } from './SurveyList.tsx';

export function Side() {
  const place = usePlace();
  const project = useWorkbench((state) => state.project);
  return (
    <div className={styles.side} data-surveys={place === 'survey'}>
      <Boundary of={project}>
        <MeterList />
        <SurveyList />
      </Boundary>
    </div>
  );
}
