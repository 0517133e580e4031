/** The screen: header, list of meters, and the place the address names. */
import { lazy, Suspense, useEffect, useState } from 'react';
import type { Commands } from '../../state/commands.ts';
import type { WorkbenchStore } from '../../state/workbench.ts';
import { Boundary } from './Boundary.tsx';
import { BindingProvider, useWorkbench } from './binding.tsx';
import { PaperOfSize } from './PaperOfSize.tsx';
import { usePlace } from './place.ts';
import { SheetPlace, type SheetsView } from './SheetPlace.tsx';
import { Size } from './Size.tsx';
import { DialogHost } from './shell/DialogHost.tsx';
import { DropZone } from './shell/DropZone.tsx';
import { DialogProvider } from './shell/dialogs.tsx';
import { Header } from './shell/Header.tsx';
import { Hotkeys } from './shell/Hotkeys.tsx';
import { Messages } from './shell/Messages.tsx';
import { Side } from './shell/Side.tsx';
import { startTheme } from './theme.ts';
import './tokens.css';
import styles from './Root.module.css';

const Read = lazy(async () => ({ default: (await import('./read/Read.tsx')).Read }));
const Survey = lazy(async () => ({ default: (await import('./survey/Survey.tsx')).Survey }));

interface Props {
  readonly store: WorkbenchStore;
  readonly commands: Commands;
  readonly sheets: SheetsView;
}

export function Root({ store, commands, sheets }: Props) {
  useState(startTheme);
  return (
    <BindingProvider store={store} commands={commands}>
      <DialogProvider>
        <DropZone>
          <Hotkeys />
          <a className={styles.skip} href="#content">
            To the content
          </a>
          <Header />
          <Messages />
          <Body sheets={sheets} />
          <DialogHost />
        </DropZone>
      </DialogProvider>
    </BindingProvider>
  );
}

function Body({ sheets }: { readonly sheets: SheetsView }) {
  const place = usePlace();
  const project = useWorkbench((state) => state.project);
  const takeToHand = useWorkbench((state) => state.takeToHand);
  useEffect(() => {
    if (place !== 'sheet') takeToHand(place === 'survey' ? 'traverses' : 'meters');
  }, [place, takeToHand]);
  return (
    <div className={styles.body}>
      <Side />
      <main className={styles.main} id="content" tabIndex={-1}>
        <Suspense fallback={<p className={styles.wait}>One moment</p>}>
          <Boundary key={place} of={project}>
            {place === 'size' && <Size />}
            {place === 'read' && <Read />}
            {place === 'survey' && <Survey />}
            {place === 'sheet' && <SheetPlace sheets={sheets} />}
          </Boundary>
          {place !== 'sheet' && <PaperOfSize list={place === 'survey' ? 'traverses' : 'meters'} sheets={sheets} />}
        </Suspense>
      </main>
    </div>
  );
}
