/**
 * What a user can order that reaches beyond the workbench: files, the projects kept in this browser, other tabs,
 * a new version of the program. app carries them out and reports through the store (keeping, notice, projects).
 */
export interface Commands {
  /** A new, empty project; the one at hand stays in the list. */
  newProject(): Promise<void>;
  openFile(): Promise<void>;
  /** A project file, or a log for the selected meter. */
  openDropped(file: File): Promise<void>;
  /** Saves to the file the project came from, or asks where; a download where the browser has no such dialog. */
  saveFile(): Promise<void>;
  /** Opens the example as a copy of its own. */
  openExample(): Promise<void>;
  openKept(id: string): Promise<void>;
  /** Opens the last sound earlier version of a kept project as a copy of its own. */
  openEarlier(id: string): Promise<void>;
  removeKept(id: string): Promise<void>;
  /** The stored text of a project that cannot be opened, as a file. */
  downloadRaw(id: string): Promise<void>;
  /** Takes the project over from the tab that holds it. */
  takeOver(): Promise<void>;
  /** Goes on with a copy of what this tab shows. */
  workOnCopy(): Promise<void>;
  /** Keeps the work, then starts the new version of the program. */
  applyUpdate(): Promise<void>;
  /** Asks for a log, for the selected meter. */
  openLog(): Promise<void>;
  /** Makes the log of a day and opens it at the selected meter. */
  openExampleLog(): Promise<void>;
  /** Converts the log at hand by its meter. */
  convertLog(): Promise<void>;
  cancelLog(): void;
  closeLog(): void;
  /** Saves the rows of the last conversion. */
  saveConverted(): void;
  print(): void;
}
