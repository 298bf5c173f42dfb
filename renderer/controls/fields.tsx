import type { ComponentChildren } from 'preact';
import { useId } from 'preact/hooks';
import { WasNote } from './WasNote';

interface TextFieldProps {
  readonly label: string;
  readonly value: string;
  readonly maxLength: number;
  readonly onCommit: (value: string) => void;
  readonly mayBeEmpty?: boolean;
  readonly hiddenLabel?: boolean;
}

export function TextField({
  label,
  value,
  maxLength,
  onCommit,
  mayBeEmpty = false,
  hiddenLabel = false,
}: TextFieldProps) {
  const id = useId();
  return (
    <div class="field">
      <label class={hiddenLabel ? 'visually-hidden' : 'field-label'} for={id}>
        {label}
      </label>
      <input
        id={id}
        class="field-input field-text"
        type="text"
        autocomplete="off"
        maxLength={maxLength}
        value={value}
        onInput={(event) => {
          const text = event.currentTarget.value;
          if (text !== '' || mayBeEmpty) onCommit(text);
        }}
        onBlur={(event) => {
          event.currentTarget.value = value;
        }}
      />
    </div>
  );
}

interface ChoiceFieldProps<T extends string> {
  readonly label: string;
  readonly value: T;
  readonly choices: readonly (readonly [T, string])[];
  readonly onPick: (value: T) => void;
  readonly was?: string | null;
  readonly problem?: string | null;
}

export function ChoiceField<T extends string>({ label, value, choices, onPick, was, problem }: ChoiceFieldProps<T>) {
  const id = useId();
  return (
    <div class="field" data-changed={was == null ? undefined : 'true'}>
      <label class="field-label" for={id}>
        {label}
      </label>
      <select
        id={id}
        class="field-input field-choice"
        value={value}
        aria-describedby={`${id}-note`}
        onChange={(event) => {
          const picked = choices.find(([key]) => key === event.currentTarget.value);
          if (picked !== undefined) onPick(picked[0]);
        }}
      >
        {choices.map(([key, words]) => (
          <option key={key} value={key}>
            {words}
          </option>
        ))}
      </select>
      <span class="field-note" id={`${id}-note`}>
        {problem != null && <span class="field-error">{problem}</span>}
        <WasNote was={was} />
      </span>
    </div>
  );
}

interface SwitchFieldProps {
  readonly label: string;
  readonly on: boolean;
  readonly onTurn: (on: boolean) => void;
  readonly was?: string | null;
}

export function SwitchField({ label, on, onTurn, was }: SwitchFieldProps) {
  return (
    <div class="field" data-changed={was == null ? undefined : 'true'}>
      <label class="switch">
        <input type="checkbox" checked={on} onChange={(event) => onTurn(event.currentTarget.checked)} />
        <span>{label}</span>
      </label>
      <WasNote was={was} />
    </div>
  );
}

/** A group of entries that can be folded away. */
export function Group({ title, children }: { readonly title: string; readonly children: ComponentChildren }) {
  return (
    <details class="group" open>
      <summary>{title}</summary>
      <div class="group-entries">{children}</div>
    </details>
  );
}
