import type { Profile } from '#shared/profile/profile.schema'
import type { ProfileCure } from '#shared/profile/profile-cure'
import { Button } from '@/components/Button'
import { useProblemWords } from '../useProblemWords'

interface Props {
  readonly profile: Profile
  readonly cure: ProfileCure
  readonly onCure: (cure: ProfileCure) => void
}

/** One press, one step of undo; its words say what it will do. */
export function CureButton({ profile, cure, onCure }: Props) {
  const words = useProblemWords()
  return (
    <Button
      variant="quiet"
      className="px-1.5! text-left font-normal! underline"
      onClick={() => onCure(cure)}
    >
      {words.cure(profile, cure)}
    </Button>
  )
}
