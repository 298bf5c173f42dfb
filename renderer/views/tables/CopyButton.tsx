import { useState } from 'preact/hooks';
import { delimited } from '../../../core/report/delimited';

interface CopyButtonProps {
  readonly rows: () => readonly (readonly (number | string | null)[])[];
}

/** Copies a table so that a spreadsheet takes it cell by cell, every number in full. */
export function CopyButton({ rows }: CopyButtonProps) {
  const [said, setSaid] = useState('');
  const copy = () =>
    navigator.clipboard.writeText(delimited(rows(), '\t')).then(
      () => setSaid('Copied'),
      () => setSaid('The clipboard is not open to this window'),
    );
  return (
    <span class="copy">
      <button type="button" class="quiet" onClick={() => void copy()}>
        Copy table
      </button>
      <span role="status">{said}</span>
    </span>
  );
}
