export type { FigureColors } from '#shared/drawing/figure-colors'
export { figureColors } from '#shared/drawing/figure-colors'
