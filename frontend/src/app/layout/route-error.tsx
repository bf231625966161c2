import { Button } from 'antd';
import { isRouteErrorResponse, Link, useRouteError } from 'react-router-dom';

import { ErrorNotice } from '../../components/error-notice';
import { Page } from '../../components/page';

/** A page that failed to load or to draw: the rest of the program stays usable. */
export function RouteError() {
  const error = useRouteError();
  const title = isRouteErrorResponse(error) ? `${error.status} ${error.statusText}` : 'This page failed.';
  return (
    <Page>
      <ErrorNotice error={error ?? new Error(title)} title={title} />
      <p style={{ marginTop: 16 }}>
        <Button onClick={() => window.location.reload()}>Load the page again</Button> <Link to="/">Go to the desk</Link>
      </p>
    </Page>
  );
}
