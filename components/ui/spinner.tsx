/** A turning ring beside words that say what is going on; itself silent. */
export function Spinner({ className = 'size-4' }: { className?: string }) {
  return (
    <svg
      viewBox="0 0 16 16"
      aria-hidden="true"
      className={`${className} shrink-0 animate-spin motion-reduce:animate-none`}
    >
      <circle
        cx="8"
        cy="8"
        r="6.5"
        fill="none"
        stroke="currentColor"
        opacity="0.3"
        strokeWidth="2"
      />
      <path d="M8 1.5A6.5 6.5 0 0 1 14.5 8" fill="none" stroke="currentColor" strokeWidth="2" />
    </svg>
  )
}
