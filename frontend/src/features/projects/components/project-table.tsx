import { Link } from 'react-router-dom';

import type { ProjectRow } from '../../../api/types';
import { formatDay } from '../../../lib/dates';

export function ProjectTable({ projects }: { projects: readonly ProjectRow[] }) {
  return (
    <div className="table-scroll">
      <table className="data-table">
        <caption className="visually-hidden">Projects</caption>
        <thead>
          <tr>
            <th scope="col">Project</th>
            <th scope="col">Seen by</th>
            <th scope="col" className="number">
              Chains
            </th>
            <th scope="col" className="number">
              Boards per build
            </th>
            <th scope="col">Currency</th>
            <th scope="col">Changed</th>
          </tr>
        </thead>
        <tbody>
          {projects.map((project) => (
            <tr key={project.id}>
              <th scope="row">
                <Link to={`/projects/${project.id}`}>
                  {project.code} {project.name}
                </Link>
              </th>
              <td>
                {project.open
                  ? 'the team'
                  : `its ${project.memberCount} member${project.memberCount === 1 ? '' : 's'} only`}
              </td>
              <td className="number">{project.chainCount}</td>
              <td className="number">{project.buildQuantity}</td>
              <td>{project.currency}</td>
              <td>{formatDay(project.updatedAt)}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
