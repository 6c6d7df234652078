import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import { TextField } from '@/components/TextField'

type Normal = [number | null, number | null, number | null]

interface Props {
  readonly normal: Normal
  readonly disabled: boolean
  readonly onChange: (normal: Normal) => void
}

const AXES = ['t', 'u', 'v'] as const

/** A number with a decimal point; null for anything else. */
const readNumber = (text: string): number | null => {
  const plain = text.trim()
  return /^-?\d+(\.\d+)?$/.test(plain) ? Number(plain) : null
}

/** The normal of a plane in the piece's own frame. */
export function NormalFields({ normal, disabled, onChange }: Props) {
  const { t } = useTranslation('ends')
  const [typed, setTyped] = useState<readonly (string | null)[]>([null, null, null])
  return (
    <div className="flex flex-col gap-2">
      <p className="text-small text-scribe">{t('normal.meaning')}</p>
      <div className="grid grid-cols-3 items-start gap-3">
        {AXES.map((axis, index) => (
          <TextField
            key={axis}
            label={t(`normal.${axis}`)}
            value={typed[index] ?? String(normal[index] ?? '')}
            disabled={disabled}
            autoComplete="off"
            error={normal[index] === null ? t('normal.refused') : undefined}
            onChange={(event) => {
              const text = event.target.value
              setTyped(typed.with(index, text))
              const [alongT, alongU, alongV] = normal
              const value = readNumber(text)
              onChange([
                index === 0 ? value : alongT,
                index === 1 ? value : alongU,
                index === 2 ? value : alongV,
              ])
            }}
          />
        ))}
      </div>
    </div>
  )
}
