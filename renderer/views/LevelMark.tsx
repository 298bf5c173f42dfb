import type { VerdictLevel } from '../../core/evaluation';
import { levelShapes, levelWords } from '../format/words';

/** Word, shape and colour together, so that none of them carries the verdict alone. */
export function LevelMark({ level }: { readonly level: VerdictLevel }) {
  return (
    <span class="level" data-level={level}>
      <span aria-hidden="true">{levelShapes[level]}</span> {levelWords[level]}
    </span>
  );
}
