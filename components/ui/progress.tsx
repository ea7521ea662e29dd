/** How far a piece of work has come. Leave `value` out when that is not known. */
export function Progress({
  label,
  value,
  max = 100,
  detail,
}: {
  label: string
  value?: number
  max?: number
  /** Beside the label, in words or numbers: "3 of 8". */
  detail?: string
}) {
  const share = value === undefined ? undefined : Math.min(1, Math.max(0, value / max))
  return (
    <div>
      <div className="flex justify-between gap-4 text-sm">
        <span>{label}</span>
        {detail ? <span className="text-ink-faint">{detail}</span> : null}
      </div>
      <div
        role="progressbar"
        aria-label={label}
        aria-valuemin={0}
        aria-valuemax={max}
        aria-valuenow={value}
        aria-valuetext={detail}
        className="mt-1 h-2 overflow-hidden rounded border border-rule bg-sheet"
      >
        <div
          className={
            share === undefined
              ? 'h-full w-1/3 animate-pulse bg-woad'
              : 'h-full bg-woad transition-[width]'
          }
          style={share === undefined ? undefined : { width: `${share * 100}%` }}
        />
      </div>
    </div>
  )
}
