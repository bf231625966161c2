import { Link } from 'react-router-dom';

import type { Desk } from '../../../api/types';

/** What waits for this person, each with the screen where it is done. */
export function WaitingList({ items }: { items: Desk['waiting'] }) {
  return (
    <ul style={{ margin: 0, paddingLeft: 18 }}>
      {items.map((item) => (
        <li key={`${item.path} ${item.title}`}>
          <Link to={item.path}>{item.title}</Link> <span className="soft">{item.text}</span>
        </li>
      ))}
    </ul>
  );
}
