import { useId } from 'react'

interface Option<Value extends string> {
  readonly value: Value
  readonly label: string
}

interface Props<Value extends string> {
  readonly legend: string
  readonly value: Value
  readonly options: readonly Option<Value>[]
  readonly onChange: (value: Value) => void
  readonly disabled?: boolean
}

/** One of a few, all of them in sight: radio buttons that look like the keys of the keypad. */
export function Choice<Value extends string>({
  legend,
  value,
  options,
  onChange,
  disabled = false,
}: Props<Value>) {
  const name = useId()
  return (
    <fieldset disabled={disabled}>
      <legend className="mb-1.5 font-semibold">{legend}</legend>
      <div className="flex flex-wrap gap-2">
        {options.map((option) => (
          <label
            key={option.value}
            className="inline-flex min-h-target cursor-pointer items-center gap-2 rounded-control border border-edge bg-sheet px-4 has-checked:border-dye has-checked:bg-dye/10 has-checked:font-semibold has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-dye"
          >
            <input
              type="radio"
              className="size-4 accent-dye outline-none"
              name={name}
              value={option.value}
              checked={option.value === value}
              onChange={() => onChange(option.value)}
            />
            {option.label}
          </label>
        ))}
      </div>
    </fieldset>
  )
}
