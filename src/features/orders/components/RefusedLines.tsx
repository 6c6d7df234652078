import { useQuery } from '@tanstack/react-query'
import { useTranslation } from 'react-i18next'
import type { FieldError } from '#shared/http/problem'
import type { OrderLine } from '#shared/orders/order.schema'
import { usePlanWords } from '@/features/drawing/usePlanWords'
import { planQuery } from '@/features/plans/api/plans.queries'

/** The line that a refusal's path speaks of: `lines.2.profile.legs.1` is the third. */
const lineIndex = ({ path }: FieldError): number | undefined => {
  const [, index] = /^lines\.(\d+)/.exec(path) ?? []
  return index === undefined ? undefined : Number(index)
}

interface Props {
  readonly lines: readonly OrderLine[]
  readonly errors: readonly FieldError[]
}

/** The lines a release was refused for, each with what is in the way and what would cure it. */
export function RefusedLines({ lines, errors }: Props) {
  const refused = lines.filter((_, index) => errors.some((error) => lineIndex(error) === index))
  return (
    <ul className="mt-2 flex flex-col gap-2">
      {refused.map((line) => (
        <li key={line.id}>
          <a className="font-semibold underline" href={`#line-${line.id}`}>
            <span className="font-figure">{line.mark}</span> {line.name}
          </a>
          <LineReasons
            line={line}
            told={errors.filter((error) => lines[lineIndex(error) ?? -1] === line)}
          />
        </li>
      ))}
    </ul>
  )
}

interface ReasonsProps {
  readonly line: OrderLine
  /** The server's words, for when its plans cannot be read. */
  readonly told?: readonly FieldError[]
}

/**
 * Why no brake bends a line, in short: the plans are asked for again, to be told in the person's
 * language. All reasons with their pictures stand in PlanDetails.
 */
export function LineReasons({ line, told = [] }: ReasonsProps) {
  const { t } = useTranslation('counter')
  const words = usePlanWords()
  const plans = useQuery(
    planQuery({ profile: line.profile, stockId: line.stock.id, pieceLength: line.length }),
  )
  if (plans.isPending) return <p className="text-small text-scribe">{t('order.reasonsPending')}</p>
  const standing = plans.data?.brakes.filter(({ plan }) => !plan.feasible)
  if (!standing || standing.length === 0) {
    return (
      <ul className="text-small" lang="en">
        {told.map(({ message }) => (
          <li key={message}>{message}</li>
        ))}
      </ul>
    )
  }
  return (
    <ul className="text-small">
      {standing.map(({ brakeId, brakeName, plan }) => (
        <li key={brakeId}>
          {brakeName}: {words.reasons(plan).slice(0, 2).join(' ')}
          {plan.cures.length > 0 && ` ${plan.cures.slice(0, 2).map(words.cure).join('. ')}.`}
        </li>
      ))}
    </ul>
  )
}
