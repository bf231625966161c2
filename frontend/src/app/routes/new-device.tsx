import { Page } from '../../components/page';

export function Component() {
  return <Page>{null}</Page>;
}
