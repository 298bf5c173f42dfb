import { useEffect, useId, useState } from 'preact/hooks';
import { type QuantityKind, quantityKinds } from '../../core/quantities/quantityKinds';
import { readQuantity } from '../../core/quantities/readQuantity';
import { editedNumber } from '../format/numbers';
import { Slider, type SliderRange } from './Slider';
import { useSettings } from './settingsContext';
import { WasNote } from './WasNote';

export interface QuantityFieldProps {
  readonly label: string;
  readonly kind: QuantityKind;
  /** null: not entered (optional fields only). */
  readonly value: number | null;
  readonly onCommit: (value: number | null) => void;
  readonly optional?: boolean;
  /** What stands there while nothing is entered, for example the computed value. */
  readonly placeholder?: string;
  /** Value of the base this formulation was copied from, when it differs. */
  readonly was?: string | null;
  /** A problem found by the evaluation, not by reading. */
  readonly problem?: string | null;
  readonly slider?: SliderRange;
}

/**
 * One number of the scenario. Typed text lives here until it can be read; every readable state is passed on at once.
 * Units, arithmetic, decimal comma and point are read by core; an unreadable text stays, with the reason under it.
 */
export function QuantityField(props: QuantityFieldProps) {
  const { label, kind, value, onCommit, optional = false, placeholder, was, problem, slider } = props;
  const decimalSign = useSettings().decimalSign.value;
  const [typed, setTyped] = useState<string | null>(null);
  const id = useId();
  const { fileUnit } = quantityKinds[kind];
  const settled = value === null ? '' : editedNumber(value, decimalSign);
  const reading = typed === null || (optional && typed.trim() === '') ? null : readQuantity(typed, kind, decimalSign);
  const fault = reading !== null && !reading.ok ? reading.problems[0] : undefined;
  const readAs =
    reading?.ok === true && typed !== null && typed.trim() !== settled
      ? (reading.value.note ?? `= ${reading.value.readAs}`)
      : null;
  const message = fault === undefined ? (problem ?? null) : `${fault.message} ${fault.remedy}`;

  const readable = reading?.ok === true ? reading.value.value : null;
  // What was refused for one kind may be readable for another: 4 wt %, once the loading is by mass.
  useEffect(() => {
    if (readable !== null && readable !== value) onCommit(readable);
  }, [kind]);

  const type = (text: string): void => {
    setTyped(text);
    if (optional && text.trim() === '') {
      if (value !== null) onCommit(null);
      return;
    }
    const read = readQuantity(text, kind, decimalSign);
    if (read.ok && read.value.value !== value) onCommit(read.value.value);
  };
  const settle = (): void => {
    // Text that cannot be read is kept for mending; anything else shows the value as it is kept.
    if (fault === undefined) setTyped(null);
  };
  const abandon = (event: KeyboardEvent): void => {
    if (event.key === 'Escape' && typed !== null) {
      event.stopPropagation();
      setTyped(null);
    } else if (event.key === 'Enter') settle();
  };

  return (
    <div
      class="field"
      data-faulty={message === null ? undefined : 'true'}
      data-changed={was == null ? undefined : 'true'}
    >
      <label class="field-label" for={id}>
        {label}
      </label>
      <span class="field-entry">
        <input
          id={id}
          class="field-input"
          type="text"
          data-typing={typed === null ? undefined : 'true'}
          inputMode="decimal"
          autocomplete="off"
          spellcheck={false}
          value={typed ?? settled}
          placeholder={placeholder}
          aria-invalid={message === null ? undefined : 'true'}
          aria-describedby={`${id}-note`}
          onInput={(event) => type(event.currentTarget.value)}
          onBlur={settle}
          onKeyDown={abandon}
        />
        <span class="field-unit">{fileUnit}</span>
      </span>
      {slider !== undefined && (
        <Slider
          label={`${label}, slider`}
          range={slider}
          value={value ?? slider.min}
          onMove={(moved) => {
            setTyped(null);
            onCommit(moved);
          }}
        />
      )}
      <span class="field-note" id={`${id}-note`}>
        {message !== null && <span class="field-error">{message}</span>}
        {message === null && readAs !== null && <span class="field-read">{readAs}</span>}
        <WasNote was={was} />
      </span>
    </div>
  );
}
