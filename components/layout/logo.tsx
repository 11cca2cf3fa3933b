/** An arm bent past an edge: ink for what stands still, marker for what gives. */
export function LogoMark({ size = 30 }: { size?: number }) {
  return (
    <svg width={size} height={size} viewBox="0 0 30 30" aria-hidden="true" fill="none">
      <path d="M4 3v24M4 8h21v4" stroke="currentColor" strokeWidth="3" />
      <path
        d="M4 15.5c9.5 0 15.5 3.5 20.5 11"
        stroke="var(--marker)"
        strokeWidth="4.5"
        strokeLinecap="round"
      />
    </svg>
  );
}
