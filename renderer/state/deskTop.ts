import type { Signal } from '@preact/signals';
import type { FileActions } from './fileActions';
import type { Workbench } from './workbench';

/** What every region of the window works with. */
export interface DeskTop {
  readonly workbench: Workbench;
  readonly files: FileActions;
  readonly shownDialog: Signal<'about' | 'keys' | null>;
}
