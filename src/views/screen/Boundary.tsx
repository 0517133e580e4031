/** Holds a mistake of ours to the place where it happened: it is said, and the rest of the work stays at hand. */
import { Component, type ReactNode } from 'react';
import styles from './Boundary.module.css';

interface Props {
  /** Another value tries again: the meter at hand, its text. */
  readonly of: unknown;
  readonly children: ReactNode;
}

interface State {
  readonly of: unknown;
  readonly defect?: string;
}

export class Boundary extends Component<Props, State> {
  override state: State = { of: this.props.of };

  static getDerivedStateFromError(error: unknown): Partial<State> {
    return { defect: error instanceof Error ? error.message : String(error) };
  }

  static getDerivedStateFromProps({ of }: Props, state: State): State | null {
    return of === state.of ? null : { of };
  }

  override render() {
    if (this.state.defect === undefined) return this.props.children;
    return (
      <div className={styles.defect} role="alert">
        <p>This part cannot be shown, and the fault is ours. What you wrote is kept; save it to a file to be safe.</p>
        <p className={styles.words}>{this.state.defect}</p>
      </div>
    );
  }
}
