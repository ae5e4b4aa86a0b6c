import { useEffect, useRef, type RefObject } from 'react'

/** Takes files that are dropped on the page outside of `area`, which handles its own. */
export function useDropBeside(
  area: RefObject<HTMLElement | null>,
  onFiles: (files: readonly File[]) => void,
): void {
  const latest = useRef(onFiles)
  useEffect(() => {
    latest.current = onFiles
  })
  useEffect(() => {
    const drop = (event: DragEvent) => {
      const isInside = event.target instanceof Node && area.current?.contains(event.target)
      const files = [...(event.dataTransfer?.files ?? [])]
      if (isInside || files.length === 0) return
      event.preventDefault()
      latest.current(files)
    }
    window.addEventListener('drop', drop)
    return () => window.removeEventListener('drop', drop)
  }, [area])
}
