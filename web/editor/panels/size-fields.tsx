import { QuantityField } from '#web/ui/quantity-field.tsx';

type Props = {
  sizeMm: readonly [number, number];
  minimum: number;
  maximum: number;
  onChange: (sizeMm: [number, number]) => void;
  disabled: boolean;
};

/** Width (x) and height (y) of a rectangle before it is rotated. */
export function SizeFields({ sizeMm: [width, height], minimum, maximum, onChange, disabled }: Props) {
  const shared = { unit: 'mm', minimum, maximum, disabled };
  return (
    <>
      <QuantityField
        {...shared}
        label="Width"
        value={width}
        onCommit={(value) => value !== null && onChange([value, height])}
      />
      <QuantityField
        {...shared}
        label="Height"
        value={height}
        onCommit={(value) => value !== null && onChange([width, value])}
      />
    </>
  );
}
