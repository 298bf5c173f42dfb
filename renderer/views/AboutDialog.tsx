import { CAUTION } from '../../core/report/caution';
import { Dialog } from '../controls/Dialog';
import { useDeskTop } from './deskTop';

export function AboutDialog({ onClose }: { readonly onClose: () => void }) {
  const facts = useDeskTop().files.facts.value;
  return (
    <Dialog title="About Sunder" onCancel={onClose}>
      <p>Will these particles stay apart? Stability estimates for coatings and inks.</p>
      <p>
        <strong>{CAUTION}</strong>
      </p>
      <p>
        Attraction after Lifshitz and Hamaker, double layers after Hogg, Healy & Fuerstenau and Bell, Levine &
        McCartney, polymer layers after Vincent and co-workers, rates after Smoluchowski and Fuchs, settling after
        Stokes. Each number says which model was used and whether it was inside its range.
      </p>
      <p class="hint">
        {facts === null ? '' : `Version ${facts.appVersion}. `}
        {facts?.documentsFolderName == null ? '' : `Files are kept in ${facts.documentsFolderName}. `}
        Sunder sends nothing anywhere.
      </p>
      <div class="dialog-actions">
        <button type="button" class="primary" onClick={onClose}>
          Close
        </button>
      </div>
    </Dialog>
  );
}
