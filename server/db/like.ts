/** A pattern for ILIKE that finds `text` anywhere, its wildcards taken as plain characters. */
export const containing = (text: string): string => `%${escapeLike(text)}%`

export const escapeLike = (text: string): string => text.replace(/[\\%_]/g, '\\$&')
