/**
 * Patterns of all pictures, once per document: slanted hatch for hidden, hatch for early or late days, level
 * lines and a slant for low ink. Drawn but without size; a hidden element would switch the patterns off.
 */
export function PictureDefs() {
  return (
    <svg width="0" height="0" style={{ position: 'absolute' }} aria-hidden="true" focusable="false">
      <defs>
        <pattern
          id="pic-hidden"
          width="7"
          height="7"
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(45)"
        >
          <path d="M0.8 0V7" stroke="var(--color-umber-soft)" strokeWidth="1.4" />
        </pattern>
        <pattern
          id="pic-margin"
          width="5"
          height="5"
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(-45)"
        >
          <rect width="5" height="5" fill="var(--color-chalk)" />
          <path d="M1.4 0V5" stroke="var(--color-umber)" strokeWidth="2.6" />
        </pattern>
        <pattern id="pic-level" width="6" height="6" patternUnits="userSpaceOnUse">
          <path d="M0 3H6" stroke="#000" strokeWidth="1.6" />
        </pattern>
        <pattern
          id="pic-slant"
          width="9"
          height="9"
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(20)"
        >
          <path d="M0 4.5H9" stroke="#000" strokeWidth="1.4" />
        </pattern>
      </defs>
    </svg>
  );
}
