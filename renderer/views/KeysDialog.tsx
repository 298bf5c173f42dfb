import { Dialog } from '../controls/Dialog';
import { keyCommands, otherKeys } from './keys';

export function KeysDialog({ onClose }: { readonly onClose: () => void }) {
  const rows = [...keyCommands.map(({ keys, words }) => [keys, words] as const), ...otherKeys];
  return (
    <Dialog title="Keys" onCancel={onClose}>
      <table class="plain">
        <tbody>
          {rows.map(([keys, words]) => (
            <tr key={keys}>
              <th scope="row">
                <kbd>{keys}</kbd>
              </th>
              <td>{words}</td>
            </tr>
          ))}
        </tbody>
      </table>
      <div class="dialog-actions">
        <button type="button" class="primary" onClick={onClose}>
          Close
        </button>
      </div>
    </Dialog>
  );
}
