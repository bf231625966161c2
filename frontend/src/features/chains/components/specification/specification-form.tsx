import type { Specification } from '../../../../api/types';
import { BandFields } from './band-fields';
import { LoadFields } from './load-fields';
import { RequirementFields } from './requirement-fields';
import { SourceFields } from './source-fields';

export interface SpecificationFieldsProps {
  specification: Specification;
  /** `field` names what was changed, so that typing in one field is one step of undo. */
  onChange: (specification: Specification, field: string) => void;
  /** Messages of the server by path below the specification, e.g. `band.lowHz`. */
  messages: Readonly<Record<string, string>>;
  currency: string;
  disabled?: boolean;
}

/** What a chain is held to: source, band, load, supply and requirements. */
export function SpecificationForm(props: SpecificationFieldsProps) {
  return (
    <>
      <SourceFields {...props} />
      <BandFields {...props} />
      <LoadFields {...props} />
      <RequirementFields {...props} />
    </>
  );
}

const PREFIX = 'specification.';

/** The messages below the specification, without its own name in the path. */
export function specificationMessages(messages: Readonly<Record<string, string>>): Readonly<Record<string, string>> {
  const own = Object.entries(messages).filter(([path]) => path.startsWith(PREFIX));
  return Object.fromEntries(own.map(([path, message]) => [path.slice(PREFIX.length), message]));
}
