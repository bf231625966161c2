/** Two lanes that turn down at their corners: headroom in patina over money in copper. */
export function LogoMark({ size = 22 }: { size?: number }) {
  return (
    <svg
      width={size}
      height={size}
      viewBox="0 0 32 32"
      fill="none"
      strokeWidth="4"
      aria-hidden="true"
      focusable="false"
    >
      <path d="M2 8h17l11 13" stroke="var(--clear)" />
      <path d="M2 17h10l8 9" stroke="var(--copper-fill)" />
    </svg>
  );
}
