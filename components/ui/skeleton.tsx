type SkeletonProps = {
  /** What is being fetched, read aloud: "Loading the findings". */
  readonly label: string
  readonly lines?: number | undefined
}

const widths = ['w-11/12', 'w-4/5', 'w-full', 'w-2/3'] as const

/** Ruled lines where the text will be. */
export const Skeleton = ({ label, lines = 4 }: SkeletonProps) => (
  <div role="status" className="flex flex-col gap-4 py-2">
    <span className="sr-only">{label}</span>
    {Array.from({ length: lines }, (_, index) => (
      <div
        key={index}
        aria-hidden="true"
        className={`h-2 animate-pulse bg-rule ${widths[index % widths.length] ?? ''}`}
      />
    ))}
  </div>
)
