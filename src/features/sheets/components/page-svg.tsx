import { memo } from 'react';
import { pathsOf, type PathOp } from '#shared/sheet/page-paths.js';
import type { Ink, SheetPage, TextPrimitive } from '#shared/sheet/primitives.js';

const MM_PER_PT = 25.4 / 72;
const COLOURS: Record<Ink, string> = { ink: '#000', paper: '#fff', grey: '#808080' };

/**
 * One page of paper, from the same primitives as the PDF. Paper is white and its ink black in every theme. Lines of
 * text are held to the width that the printed typeface gives them.
 */
export const PageSvg = memo(function PageSvg({
  page,
  label,
  className,
}: {
  page: SheetPage;
  /** Empty where words beside it name the page. */
  label: string;
  className?: string | undefined;
}) {
  const spoken = label === '' ? { 'aria-hidden': true } : { role: 'img', 'aria-label': label };
  return (
    <svg {...spoken} className={className} viewBox={`0 0 ${String(page.width)} ${String(page.height)}`}>
      <rect width={page.width} height={page.height} fill="#fff" />
      {page.primitives.map((primitive, index) =>
        primitive.type === 'text' ? (
          <PageText key={index} text={primitive} />
        ) : (
          pathsOf(primitive).map((op, part) => <PagePath key={`${String(index)}.${String(part)}`} op={op} />)
        ),
      )}
    </svg>
  );
});

function PagePath({ op }: { op: PathOp }) {
  const { d, fill, stroke, strokeMm, dashMm, cap, move } = op;
  return (
    <path
      d={d}
      fill={fill === null ? 'none' : COLOURS[fill]}
      fillRule="evenodd"
      stroke={stroke === null ? 'none' : COLOURS[stroke]}
      strokeWidth={stroke === null ? undefined : strokeMm}
      strokeDasharray={dashMm === null ? undefined : dashMm.join(' ')}
      strokeLinecap={cap}
      strokeLinejoin={cap === 'round' ? 'round' : 'miter'}
      transform={
        move === null
          ? undefined
          : `translate(${String(move.x)} ${String(move.y)}) scale(${String(move.scale)})`
      }
    />
  );
}

function PageText({ text }: { text: TextPrimitive }) {
  const outlined = text.paint === 'outline' || text.paint === 'grey-outline';
  const edge = text.paint === 'grey-outline' ? COLOURS.grey : COLOURS.ink;
  return (
    <>
      {text.lines.map((line, index) => (
        <text
          key={index}
          x={line.x}
          y={line.baseline}
          fontFamily="var(--font-board)"
          fontSize={text.sizePt * MM_PER_PT}
          fontWeight={text.weight}
          fill={outlined ? 'none' : text.paint === 'paper' ? COLOURS.paper : COLOURS.ink}
          {...(outlined ? { stroke: edge, strokeWidth: 0.35 } : {})}
          {...(line.width > 0 ? { textLength: line.width, lengthAdjust: 'spacingAndGlyphs' } : {})}
          {...(text.turnDeg === 0
            ? {}
            : { transform: `rotate(${String(-text.turnDeg)} ${String(line.x)} ${String(line.baseline)})` })}
        >
          {line.text}
        </text>
      ))}
    </>
  );
}
