import type { Project } from '../../../api/types';
import { Facts } from '../../../components/facts';
import { CASE_LABELS } from '../lib/policy-fields';

/** Who sees a project and which margins its verdicts keep. */
export function ProjectFacts({ project }: { project: Project }) {
  const { policy } = project;
  const facts: readonly (readonly [string, string])[] = [
    ['Seen by', project.open ? 'everybody in the team' : 'its members only'],
    ['Members', project.members.map((member) => member.name).join(', ') || 'none'],
    ['Build', `${project.buildQuantity} boards, prices in ${project.currency}`],
    ['Verdicts for', CASE_LABELS[policy.gbwCase]],
    ['Headroom target', `×${policy.headroomTarget} GBW, ×${policy.slewTarget} slew`],
    ['Bandwidth target', `×${policy.bandwidthTarget} of the top edge`],
  ];
  return <Facts facts={facts} wide />;
}
