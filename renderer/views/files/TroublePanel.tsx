import { useDeskTop } from '../deskTop';

/** A file that was refused: every problem with its place and what to do. The work on screen is untouched. */
export function TroublePanel() {
  const { files } = useDeskTop();
  const trouble = files.trouble.value;
  if (trouble === null) return null;
  return (
    <section class="trouble" role="alert">
      <div>
        <strong>{trouble.title}.</strong> Your work here is as it was.
        <ul>
          {trouble.problems.slice(0, 12).map(({ at, message, remedy }) => (
            <li key={`${at}${message}`}>
              {at !== '' && <code>{at}</code>} {message} {remedy}
            </li>
          ))}
          {trouble.problems.length > 12 && <li>and {trouble.problems.length - 12} more</li>}
        </ul>
      </div>
      <button type="button" onClick={files.dismissTrouble}>
        Dismiss
      </button>
    </section>
  );
}
