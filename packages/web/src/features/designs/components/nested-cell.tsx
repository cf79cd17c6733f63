interface NestedProps {
  kind: 'groups' | 'subclusters';
  active: boolean;
  hue: string;
  x: number;
  y: number;
  width: number;
  height: number;
}

/** A cell whose participants stand in groups, or in subclusters within clusters. */
export function Nested({ kind, active, hue, ...box }: NestedProps) {
  const fill = active ? hue : 'none';
  const inner = (x: number, width: number) => (
    <rect
      key={x}
      x={x}
      y={box.y + (kind === 'groups' ? 0 : 2)}
      width={width}
      height={Math.max(1, box.height - (kind === 'groups' ? 0 : 4))}
      fill={fill}
      stroke={hue}
    />
  );
  if (kind === 'groups') {
    const width = box.width / 4;
    return <g>{[0, 1, 2, 3].map((group) => inner(box.x + group * width, width - 2))}</g>;
  }
  const cluster = box.width / 2;
  const width = (cluster - 6) / 2;
  return (
    <g>
      {[0, 1].map((index) => {
        const x = box.x + index * cluster;
        return (
          <g key={index}>
            <rect x={x} y={box.y} width={cluster - 2} height={box.height} fill="none" stroke={hue} />
            {inner(x + 2, width - 0.5)}
            {inner(x + 2.5 + width, width - 0.5)}
          </g>
        );
      })}
    </g>
  );
}
