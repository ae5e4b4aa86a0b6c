/** Resolves a token of the notebook as the canvas needs it: for the theme in force at this moment, at this place. */
export const cssColour = (host: HTMLElement, token: string): string => {
  const probe = document.createElement('span')
  probe.style.color = `var(--${token})`
  host.append(probe)
  const colour = getComputedStyle(probe).color
  probe.remove()
  return colour
}
