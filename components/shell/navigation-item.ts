export type NavigationItem = {
  readonly label: string
  readonly href: string
  readonly current?: boolean | undefined
}
