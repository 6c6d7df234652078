import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import type { Order } from '#shared/orders/order.schema'
import { Notice } from '@/components/Notice'
import { TextArea } from '@/components/TextArea'
import { errorWords } from '@/lib/api/error-words'
import { useFormats } from '@/lib/format/useFormats'
import type { useAnswerQuestion } from '../api/orders.mutations'

interface Props {
  readonly formId: string
  readonly order: Order
  readonly answer: ReturnType<typeof useAnswerQuestion>
}

/** The shop's open question and the field for its answer; the button stands at the bottom edge. */
export function QuestionAnswer({ formId, order, answer }: Props) {
  const { t } = useTranslation('orders')
  const { moment } = useFormats()
  const [text, setText] = useState('')
  const [missing, setMissing] = useState(false)
  const question = order.events.findLast(({ kind }) => kind === 'question')
  return (
    <form
      id={formId}
      noValidate
      className="flex max-w-prose flex-col gap-3 border-l-4 border-chalk pl-4"
      onSubmit={(event) => {
        event.preventDefault()
        if (answer.isPending) return
        setMissing(text.trim() === '')
        if (text.trim() !== '') answer.mutate({ version: order.version, text })
      }}
    >
      {question && (
        <div>
          <p className="text-small text-scribe">
            {t('question.asked', { name: question.by, moment: moment(question.at) })}
          </p>
          <p className="text-lead font-semibold whitespace-pre-line">{question.text}</p>
        </div>
      )}
      <TextArea
        label={t('question.answer')}
        hint={t('question.hint')}
        value={text}
        maxLength={1000}
        error={missing && text.trim() === '' ? t('question.missing') : undefined}
        onChange={(event) => setText(event.target.value)}
      />
      {answer.error && (
        <Notice kind="error">
          <strong className="block">{t(`problems:${errorWords(answer.error)}.happened`)}</strong>
          {t(`problems:${errorWords(answer.error)}.todo`)}
        </Notice>
      )}
    </form>
  )
}
