import { useTranslation } from 'react-i18next'
import type { Part } from '#shared/drawing/display-list'

/** What a part is called: "Leg 2", "Bend 1", "Hem at B". */
export function usePartName() {
  const { t } = useTranslation('drawing')
  return (part: Part): string => {
    switch (part.kind) {
      case 'leg':
        return t('part.leg', { number: part.leg })
      case 'bend':
        return t('part.bend', { number: part.bend })
      case 'hem':
        return t('part.hem', { edge: part.edge })
      case 'edge':
        return t('part.edge', { edge: part.edge })
    }
  }
}
