import { makeStyles, tokens } from '@fluentui/react-components';
import { useId } from 'react';
import { Link } from 'react-router-dom';
import type { Progress } from '../../features/studies/model/progress';
import { ownTokens } from '../../shared/ui/own-tokens';
import type { StudyPage } from './study-pages';

const useStyles = makeStyles({ mark: { flexShrink: 0, overflow: 'visible' } });

interface PageLinkProps {
  page: StudyPage;
  className: string;
  onGo?: () => void;
}

/** A link to one of a study's pages, with how far the page has got. */
export function PageLink({ page: { label, path, current, progress }, className, onGo }: PageLinkProps) {
  const told = useId();
  return (
    <>
      <Link
        to={path}
        aria-current={current ? 'page' : undefined}
        aria-describedby={progress && told}
        title={progress?.says}
        className={className}
        onClick={onGo}
      >
        {progress && <Mark {...progress} />}
        {label}
      </Link>
      {progress && (
        <span id={told} hidden>
          {progress.says}
        </span>
      )}
    </>
  );
}

/** A dot, filled, half filled or empty. */
function Mark({ mark }: Progress) {
  const hue = { done: ownTokens.fits, part: tokens.colorBrandForeground1, empty: tokens.colorNeutralStroke1 };
  return (
    <svg width="10" height="10" viewBox="0 0 10 10" aria-hidden="true" className={useStyles().mark}>
      <circle
        cx="5"
        cy="5"
        r="4.1"
        stroke={hue[mark]}
        strokeWidth="1.8"
        fill={mark === 'done' ? hue[mark] : 'none'}
      />
      {mark === 'part' && <path d="M5 1 A4 4 0 0 1 5 9 Z" fill={hue[mark]} />}
    </svg>
  );
}
