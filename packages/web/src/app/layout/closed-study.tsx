import { PageBody } from '../../shared/ui/page-body';
import { TextLink } from '../../shared/ui/text-link';
import { paths } from '../paths';

/** In place of a study's pages, for somebody who was on one of them when the study was closed to them. */
export function ClosedStudy({ name }: { name: string }) {
  return (
    <PageBody
      heading={`${name} is not open to you any more`}
      sub="Somebody has taken you off its members or changed your role, or the study is gone."
    >
      <title>Study not open · Steelyard</title>
      <p>
        If that comes as a surprise, ask a methodologist of the study. What you had typed and not saved is
        kept here: it will be in its place if you are added again.
      </p>
      <p>
        <TextLink to={paths.studies}>Go to your studies</TextLink>
      </p>
    </PageBody>
  );
}
