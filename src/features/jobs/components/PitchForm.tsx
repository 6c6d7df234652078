import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import type { Job } from '#shared/jobs/jobs.contract'
import { Button } from '@/components/Button'
import { Notice } from '@/components/Notice'
import { TextField } from '@/components/TextField'
import { errorWords } from '@/lib/api/error-words'
import { useUpdateJob } from '../api/jobs.mutations'
import { parsePitch } from '../pitch'
import { PitchSign } from './PitchSign'

/** The pitch of the job, which every bend that follows the roof takes its angle from. */
export function PitchForm({ job }: { readonly job: Job }) {
  const { t } = useTranslation('jobs')
  const { mutate, error, isPending, reset } = useUpdateJob(job.id)
  const [text, setText] = useState<string | null>(null)
  const [pressed, setPressed] = useState(false)
  const pitch = parsePitch(text ?? '')

  function close() {
    setText(null)
    setPressed(false)
    reset()
  }

  if (text === null) {
    return (
      <div className="flex flex-wrap items-center gap-x-4">
        <span className="text-lead">
          <span className="sr-only">{t('pitch')} </span>
          <PitchSign rise={job.pitchRise} />
        </span>
        <Button variant="quiet" onClick={() => setText(String(job.pitchRise))}>
          {t('changePitch')}
        </Button>
      </div>
    )
  }
  return (
    <form
      noValidate
      className="flex max-w-md flex-col gap-3"
      onSubmit={(event) => {
        event.preventDefault()
        setPressed(true)
        if (!pitch.ok || isPending) return
        mutate({ version: job.version, pitchRise: pitch.rise }, { onSuccess: close })
      }}
    >
      <TextField
        label={t('pitch')}
        hint={t('pitchMeaning')}
        value={text}
        inputMode="decimal"
        autoComplete="off"
        error={pressed && !pitch.ok ? t(`pitchRefused.${pitch.refusal}`) : undefined}
        onChange={(event) => setText(event.target.value)}
      />
      {error && (
        <Notice kind="error">
          <strong className="block">{t(`problems:${errorWords(error)}.happened`)}</strong>
          {t(`problems:${errorWords(error)}.todo`)}
        </Notice>
      )}
      <div className="flex gap-3">
        <Button type="submit" pending={isPending}>
          {t('savePitch')}
        </Button>
        <Button variant="quiet" onClick={close}>
          {t('cancel')}
        </Button>
      </div>
    </form>
  )
}
