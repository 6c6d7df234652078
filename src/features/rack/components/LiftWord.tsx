import { useTranslation } from 'react-i18next'
import { liftOf } from '#shared/bundles/lift-rule'
import { useUnits } from '@/features/people/useUnits'

interface Props {
  readonly weight: number
  readonly longest: number
}

/** What a bundle weighs and how many people lift it. */
export function LiftWord({ weight, longest }: Props) {
  const { t } = useTranslation('rack')
  const { weight: print } = useUnits()
  const lift = liftOf({ weight, longest })
  return (
    <span className={lift === 'onePerson' ? '' : lift === 'neverOne' ? 'text-chalk' : 'text-ochre'}>
      <span className="font-figure">{print(weight)}</span>
      {lift !== 'onePerson' && `, ${t(`lift.${lift}`)}`}
    </span>
  )
}
