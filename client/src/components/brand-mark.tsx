/** The mark: a balance that leans towards what weighs more. */
export function BrandMark() {
  return (
    <svg
      className="brand-mark"
      viewBox="0 0 32 28"
      width="28"
      height="24"
      aria-hidden="true"
      focusable="false"
    >
      <g fill="none" stroke="currentColor" strokeWidth="2.2" strokeLinecap="round">
        <path d="M4 11.5 28 6.5M16 4v19.5M10 24h12" />
        <path strokeWidth="1.2" d="M5 12v4M27.5 7v4" />
      </g>
      <path d="M1.5 16.5h7v4h-7z" fill="var(--teal-9)" />
      <path d="M24.5 11.5h6v3.4h-6z" fill="var(--plum-9)" />
    </svg>
  );
}
