import { MainRegion } from '../../shared/ui/main-region';
import { PageBody } from '../../shared/ui/page-body';
import { TextLink } from '../../shared/ui/text-link';
import { paths } from '../paths';

export function NotFoundPage() {
  return (
    <MainRegion>
      <title>Page not found · Steelyard</title>
      <PageBody heading="There is no page at this address" sub="The link may be old, or mistyped.">
        <p>
          <TextLink to={paths.studies}>Go to your studies</TextLink>
        </p>
      </PageBody>
    </MainRegion>
  );
}
