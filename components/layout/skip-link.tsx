/** The first stop of the Tab key: past the margins to the sheet (`#sheet`). */
export function SkipLink() {
  return (
    <a
      href="#sheet"
      className="fixed top-2 left-2 z-50 -translate-y-20 rounded bg-woad px-4 py-2.5 font-medium text-on-woad focus:translate-y-0 print:hidden"
    >
      Skip to the sheet
    </a>
  )
}
