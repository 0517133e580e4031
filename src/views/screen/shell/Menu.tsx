/** What is seldom ordered: projects, files, display and theme. */
import type { Display } from '../../../core/document/project.ts';
import { useCommands, useWorkbench } from '../binding.tsx';
import { setTheme, THEMES, useTheme } from '../theme.ts';
import { useDialogs } from './dialogs.tsx';
import styles from './Menu.module.css';

const ID = 'menu';
const DISPLAYS: readonly Display[] = ['SI', 'US'];

export function Menu() {
  return (
    <>
      <button type="button" className={styles.opener} popoverTarget={ID}>
        Menu
      </button>
      <div id={ID} popover="auto" className={styles.menu}>
        <Orders />
        <DisplayChoice />
        <ThemeChoice />
      </div>
    </>
  );
}

function Orders() {
  const commands = useCommands();
  const { show } = useDialogs();
  const orders: readonly (readonly [words: string, order: () => void])[] = [
    ['New project', () => void commands.newProject()],
    ['Open a file', () => void commands.openFile()],
    ['Save to a file', () => void commands.saveFile()],
    ['Projects in this browser', () => show('kept')],
    ['Open the example, Tern Island works', () => void commands.openExample()],
    ['Title block, site, base state', () => show('project')],
    ['Keys', () => show('keys')],
  ];
  return orders.map(([words, order]) => (
    <button
      key={words}
      type="button"
      className={styles.order}
      popoverTarget={ID}
      popoverTargetAction="hide"
      onClick={order}
    >
      {words}
    </button>
  ));
}

function DisplayChoice() {
  const display = useWorkbench((state) => state.project.display ?? 'SI');
  const setDisplay = useWorkbench((state) => state.setDisplay);
  return (
    <fieldset className={styles.choice}>
      <legend>Results in</legend>
      {DISPLAYS.map((one) => (
        <label key={one}>
          <input type="radio" name="display" checked={display === one} onChange={() => setDisplay(one)} />
          {one} units
        </label>
      ))}
    </fieldset>
  );
}

function ThemeChoice() {
  const theme = useTheme();
  return (
    <fieldset className={styles.choice}>
      <legend>Paper</legend>
      {THEMES.map(({ id, label }) => (
        <label key={id}>
          <input type="radio" name="theme" checked={theme === id} onChange={() => setTheme(id)} />
          {label}
        </label>
      ))}
    </fieldset>
  );
}
