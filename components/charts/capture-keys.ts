import { panned, zoomed, type TimeWindow } from '@/lib/figure/time-window'

/** What a key does to the view when the plot has the focus; null for keys that mean nothing here. */
export const windowAfterKey = (key: string, window: TimeWindow, whole: TimeWindow): TimeWindow | null => {
  switch (key) {
    case '+':
    case '=':
      return zoomed(window, 0.5, whole)
    case '-':
      return zoomed(window, 2, whole)
    case 'ArrowLeft':
      return panned(window, -0.1, whole)
    case 'ArrowRight':
      return panned(window, 0.1, whole)
    case 'Home':
    case '0':
      return whole
    default:
      return null
  }
}
