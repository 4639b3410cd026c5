import type { ComponentProps } from 'react';
import { type ButtonLook, buttonClass } from './button-class.ts';
import { classes } from './classes.ts';

/** A button; `danger` is kept for what takes something away. */
export function Button({ variant, size, className, type = 'button', ...rest }: ButtonLook & ComponentProps<'button'>) {
  return (
    <button
      {...rest}
      type={type}
      className={classes(buttonClass({ ...(variant && { variant }), ...(size && { size }) }), className)}
    />
  );
}
