import { useId, useRef, useState } from 'preact/hooks';
import { WasNote } from './WasNote';

export interface PickerOption {
  readonly id: string;
  readonly name: string;
  readonly hint: string;
}

interface PickerProps {
  readonly label: string;
  readonly options: readonly PickerOption[];
  readonly value: string;
  readonly onPick: (id: string) => void;
  readonly was?: string | null;
  readonly hiddenLabel?: boolean;
}

const matches = (option: PickerOption, sought: string): boolean =>
  sought
    .toLowerCase()
    .split(/\s+/)
    .every((word) => `${option.name} ${option.hint} ${option.id}`.toLowerCase().includes(word));

/** Searchable choice after the ARIA combobox pattern: type to narrow, arrows to move, Enter to take, Escape to leave. */
export function Picker({ label, options, value, onPick, was, hiddenLabel = false }: PickerProps) {
  const id = useId();
  const input = useRef<HTMLInputElement>(null);
  const [sought, setSought] = useState<string | null>(null);
  const [marked, setMarked] = useState(0);
  const chosen = options.find((option) => option.id === value);
  const open = sought !== null;
  const shown = open ? options.filter((option) => matches(option, sought)) : [];

  const leave = () => setSought(null);
  const take = (option: PickerOption | undefined) => {
    if (option !== undefined && option.id !== value) onPick(option.id);
    leave();
  };
  const show = () => {
    setSought('');
    setMarked(
      Math.max(
        0,
        options.findIndex((option) => option.id === value),
      ),
    );
  };
  const onKey = (event: KeyboardEvent): void => {
    if (event.key === 'ArrowDown' || event.key === 'ArrowUp') {
      event.preventDefault();
      if (!open) {
        show();
        return;
      }
      const step = event.key === 'ArrowDown' ? 1 : -1;
      setMarked((marked + step + shown.length) % Math.max(1, shown.length));
    } else if (event.key === 'Enter' && open) {
      event.preventDefault();
      take(shown[marked]);
    } else if (event.key === 'Escape' && open) {
      event.stopPropagation();
      leave();
    }
  };

  return (
    <div class="field picker" data-changed={was == null ? undefined : 'true'}>
      <label class={hiddenLabel ? 'visually-hidden' : 'field-label'} for={id}>
        {label}
      </label>
      <input
        ref={input}
        id={id}
        class="field-input field-text"
        type="text"
        data-typing={open ? 'true' : undefined}
        role="combobox"
        autocomplete="off"
        spellcheck={false}
        aria-expanded={open}
        aria-controls={`${id}-list`}
        aria-autocomplete="list"
        aria-activedescendant={open && shown[marked] !== undefined ? `${id}-${shown[marked].id}` : undefined}
        value={sought === null || sought === '' ? (chosen?.name ?? value) : sought}
        onFocus={(event) => event.currentTarget.select()}
        onClick={() => {
          if (!open) show();
        }}
        onInput={(event) => {
          setSought(event.currentTarget.value);
          setMarked(0);
        }}
        onKeyDown={onKey}
        onBlur={leave}
      />
      {/* biome-ignore lint/a11y/noNoninteractiveElementToInteractiveRole: the list of the ARIA combobox pattern */}
      <ul class="picker-list" id={`${id}-list`} role="listbox" aria-label={label} hidden={!open}>
        {shown.map((option, index) => (
          // biome-ignore lint/a11y/useFocusableInteractive: focus stays in the text field, which points at the marked option
          <li
            key={option.id}
            id={`${id}-${option.id}`}
            // biome-ignore lint/a11y/noNoninteractiveElementToInteractiveRole: an option of the ARIA combobox pattern
            role="option"
            aria-selected={index === marked}
            // Before blur, or the list would be gone when the click arrives.
            onMouseDown={(event) => {
              event.preventDefault();
              take(option);
            }}
          >
            {option.name} <small>{option.hint}</small>
          </li>
        ))}
        {open && shown.length === 0 && <li class="picker-none">Nothing by this name</li>}
      </ul>
      <WasNote was={was} />
    </div>
  );
}
