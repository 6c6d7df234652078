import { escapeHtml } from '#server/features/mail/templates/escape-html'
import type { MailBlock, MailWords } from '#server/features/mail/templates/mail-words'
import { PALETTE } from '#shared/drawing/palette'
import type { Language } from '#shared/people/people.contract'

const { paper, sheet, ink, scribe, rule, dye } = PALETTE.light

const FACE = "font-family:'Atkinson Hyperlegible Next',Arial,Helvetica,sans-serif"
const FIGURES = "font-family:'JetBrains Mono',Consolas,Menlo,monospace"
const CELL = `padding:8px 12px 8px 0;border-bottom:1px solid ${rule};text-align:left;vertical-align:top`

/**
 * The mail as HTML. Every text says its color and stands on a ground that says its own, so that a
 * mail program that darkens one darkens both. Styles are attributes only: many programs drop style
 * elements, and the office's page allows none. Pictures add nothing that the words do not say.
 */
export const mailHtml = (
  { subject, heading, blocks }: MailWords,
  { language, foot }: { readonly language: Language; readonly foot: string },
): string => `<!doctype html>
<html lang="${language}">
<head>
<meta charset="utf-8">
<meta name="viewport" content="width=device-width, initial-scale=1">
<meta name="color-scheme" content="light">
<title>${escapeHtml(subject)}</title>
</head>
<body bgcolor="${paper}" style="margin:0;padding:24px 16px;background-color:${paper};color:${ink};${FACE};font-size:16px;line-height:1.5">
<table role="presentation" width="100%" cellspacing="0" cellpadding="0" style="max-width:600px;margin:0 auto"><tr>
<td bgcolor="${sheet}" style="padding:24px;background-color:${sheet};color:${ink};border-top:3px solid ${ink}">
<p style="margin:0 0 20px;color:${ink};font-weight:bold">Foldyard</p>
<h1 style="margin:0 0 16px;color:${ink};font-size:22px;line-height:1.3">${escapeHtml(heading)}</h1>
${blocks.map(htmlOf).join('\n')}
<p style="margin:28px 0 0;padding-top:12px;border-top:1px solid ${rule};color:${scribe};font-size:14px">${escapeHtml(foot)}</p>
</td></tr></table>
</body>
</html>
`

const lines = (text: string): string => escapeHtml(text).replaceAll('\n', '<br>')

function htmlOf(block: MailBlock): string {
  switch (block.kind) {
    case 'text':
      return `<p style="margin:0 0 16px;color:${ink}">${lines(block.text)}</p>`
    case 'remark':
      return `<p style="margin:0 0 16px;color:${scribe};font-size:14px">${lines(block.text)}</p>`
    case 'quote':
      return `<blockquote style="margin:0 0 16px;padding:4px 0 4px 16px;border-left:4px solid ${dye};color:${ink}">${lines(block.text)}</blockquote>`
    case 'facts':
      return table(
        block.rows.map(
          ([label, value]) =>
            `<tr><th scope="row" style="${CELL};color:${scribe};font-weight:normal">${escapeHtml(label)}</th><td style="${CELL};color:${ink};${FIGURES}">${lines(value)}</td></tr>`,
        ),
      )
    case 'table':
      return table([
        `<tr>${block.head.map((text) => `<th scope="col" style="${CELL};color:${scribe};font-weight:normal">${escapeHtml(text)}</th>`).join('')}</tr>`,
        ...block.rows.map(
          (row) =>
            `<tr>${row.map((text) => `<td style="${CELL};color:${ink}">${lines(text)}</td>`).join('')}</tr>`,
        ),
      ])
    case 'link':
      return `<p style="margin:20px 0"><a href="${escapeHtml(block.url)}" style="display:inline-block;padding:12px 20px;background-color:${dye};color:${sheet};font-weight:bold;text-decoration:none">${escapeHtml(block.label)}</a></p>
<p style="margin:0 0 16px;color:${scribe};font-size:14px;word-break:break-all">${escapeHtml(block.url)}</p>`
    case 'picture':
      return `<p style="margin:0 0 16px"><img src="cid:${escapeHtml(block.contentId)}" alt="${escapeHtml(block.alt)}" width="200" height="200" style="display:block;background-color:#FFFFFF"></p>`
  }
}

const table = (rows: readonly string[]): string =>
  `<table cellspacing="0" cellpadding="0" style="width:100%;margin:0 0 16px;border-collapse:collapse">${rows.join('')}</table>`
