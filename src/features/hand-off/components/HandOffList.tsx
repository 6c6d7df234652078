import { useTranslation } from 'react-i18next'
import type { HandOffSheet } from '#shared/hand-off/hand-off.contract'
import { useFormats } from '@/lib/format/useFormats'
import { bundleMark } from '@/features/rack/bundle-words'
import { isSigned } from '../signature'
import { SignatureFigure } from './SignatureFigure'

/** What has gone: who received it, when, from whom, with the signature. */
export function HandOffList({ handOffs, bundles }: Pick<HandOffSheet, 'handOffs' | 'bundles'>) {
  const { t } = useTranslation('hand-off')
  const { moment } = useFormats()
  if (handOffs.length === 0) return null
  const marks = (codes: readonly string[]) =>
    bundles.filter(({ code }) => codes.includes(code)).map(bundleMark)
  return (
    <section aria-labelledby="handed-over">
      <h2 id="handed-over" className="mb-2 font-bold">
        {t('done.title')}
      </h2>
      <ul className="divide-y divide-rule border-y border-rule">
        {handOffs.map(({ id, at, receivedBy, handedBy, bundleCodes, signature }) => (
          <li key={id} className="flex flex-wrap items-center gap-x-5 gap-y-1 py-3">
            <div className="min-w-52 flex-1">
              <p className="font-semibold">{receivedBy}</p>
              <p className="text-small text-scribe">
                <time dateTime={at}>{moment(at)}</time> · {t('done.by', { name: handedBy })}
              </p>
            </div>
            <p className="font-figure">
              {bundleCodes.length === 0 ? (
                <span className="font-sans text-scribe">{t('done.allBack')}</span>
              ) : (
                marks(bundleCodes).join(' ')
              )}
            </p>
            {isSigned(signature) ? (
              <SignatureFigure
                signature={signature}
                title={t('done.signature', { name: receivedBy })}
                className="h-14 w-36 border border-rule bg-sheet"
              />
            ) : (
              <p className="w-36 text-small text-scribe">{t('done.onPaper')}</p>
            )}
          </li>
        ))}
      </ul>
    </section>
  )
}
