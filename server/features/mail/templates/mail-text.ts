import type { MailBlock, MailWords } from '#server/features/mail/templates/mail-words'

/** The mail as plain text. */
export const mailText = ({ heading, blocks }: MailWords, foot: string): string =>
  [heading, ...blocks.map(textOf), `--\n${foot}`].filter((text) => text !== '').join('\n\n') + '\n'

function textOf(block: MailBlock): string {
  switch (block.kind) {
    case 'text':
    case 'remark':
      return block.text
    case 'quote':
      return block.text
        .split('\n')
        .map((line) => `> ${line}`)
        .join('\n')
    case 'facts':
      return block.rows.map(([label, value]) => `${label}: ${value}`).join('\n')
    case 'table':
      return [block.head, ...block.rows].map((row) => row.join(' | ')).join('\n')
    case 'link':
      return `${block.label}:\n${block.url}`
    case 'picture':
      return ''
  }
}
