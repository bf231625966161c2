import { Button, type ButtonProps } from 'antd';
import { useHref, useLinkClickHandler } from 'react-router-dom';

/** A button that goes to an address: opens in a new tab like any link. */
export function LinkButton({ to, ...props }: Omit<ButtonProps, 'href' | 'onClick'> & { to: string }) {
  const href = useHref(to);
  const follow = useLinkClickHandler(to);
  return (
    <Button
      {...props}
      href={href}
      onClick={(event) => follow(event as unknown as React.MouseEvent<HTMLAnchorElement>)}
    />
  );
}
