import { makeStyles, mergeClasses } from '@fluentui/react-components';
import { Link } from 'react-router-dom';
import { Disclosure } from '../../shared/ui/disclosure';
import { OptionTag } from '../../shared/ui/option-tag';
import { onBar } from '../../shared/ui/own-tokens';
import { usePanelStyles } from '../../shared/ui/panel-item';
import { paths } from '../paths';
import { PageLink } from './page-link';
import { type StudyPage, type StudyPages, useStudyPages } from './study-pages';

const useStyles = makeStyles({
  trail: { minWidth: 0, color: onBar.muted, '@media (max-width: 900px)': { display: 'none' } },
  steps: { display: 'flex', alignItems: 'center', gap: '10px', whiteSpace: 'nowrap' },
  step: { minWidth: 0, overflow: 'hidden', textOverflow: 'ellipsis', padding: '4px 0' },
  link: {
    color: 'inherit',
    textDecorationLine: 'none',
    borderRadius: '4px',
    ':hover': { color: onBar.text, textDecorationLine: 'underline' },
    ':focus-visible': { outline: `2px solid ${onBar.text}` },
  },
  current: { color: onBar.text, fontWeight: 700 },
  chip: {
    flexShrink: 0,
    marginLeft: '6px',
    padding: '1px 10px',
    borderRadius: '999px',
    border: `1px solid ${onBar.edge}`,
    color: onBar.text,
    fontSize: '13px',
    lineHeight: '20px',
  },
  menu: { '@media (min-width: 901px)': { display: 'none' } },
  where: { overflow: 'hidden', textOverflow: 'ellipsis', whiteSpace: 'nowrap' },
});

/** Where one is in a study: a trail of links, or on a small screen the study's pages as a menu. */
export function StudyTrail({ studyId }: { studyId: string }) {
  const pages = useStudyPages(studyId);
  if (!pages) return null;
  const working = pages.workings.find(({ current }) => current);
  const page = [...pages.main, ...pages.about].find(({ current }) => current);
  const here = working ? `Working of ${working.letter}` : (page?.label ?? 'Weigh');
  return (
    <>
      <Trail pages={pages} here={here} />
      <PagesMenu pages={pages} here={here} />
    </>
  );
}

interface Place {
  pages: StudyPages;
  here: string;
}

function Trail({ pages, here }: Place) {
  const styles = useStyles();
  return (
    <nav aria-label="Breadcrumb" className={styles.trail}>
      <ol className={styles.steps}>
        <li>
          <Link to={paths.studies} className={styles.link}>
            Studies
          </Link>
        </li>
        <li aria-hidden="true">/</li>
        <li className={styles.step}>
          <Link to={pages.home} className={styles.link}>
            {pages.name}
          </Link>
        </li>
        <li aria-hidden="true">/</li>
        <li className={styles.current} aria-current="page">
          {here}
        </li>
        {pages.fictional && <li className={styles.chip}>Fictional data</li>}
      </ol>
    </nav>
  );
}

function PagesMenu({ pages, here }: Place) {
  const styles = useStyles();
  const panel = usePanelStyles();
  return (
    <Disclosure
      label={`${pages.name}, ${here}: pages`}
      align="start"
      className={styles.menu}
      trigger={
        <span className={styles.where}>
          {pages.name} · {here}&nbsp;▾
        </span>
      }
    >
      {(close) => (
        <nav aria-label="Pages">
          <Link to={paths.studies} className={panel.item} onClick={close}>
            Studies
          </Link>
          <div className={panel.group}>
            <MenuItems pages={pages.main} onGo={close} />
          </div>
          <div className={panel.group}>
            <p className={panel.heading}>Working</p>
            {pages.workings.map(({ id, letter, position, name, ruledOut, path, current }) => (
              <Link
                key={id}
                to={path}
                aria-current={current ? 'page' : undefined}
                className={mergeClasses(panel.item, current && panel.here)}
                onClick={close}
              >
                <OptionTag letter={letter} position={position} small outlined={ruledOut} />
                <span>{name}</span>
              </Link>
            ))}
          </div>
          <div className={panel.group}>
            <MenuItems pages={pages.about} onGo={close} />
          </div>
        </nav>
      )}
    </Disclosure>
  );
}

function MenuItems({ pages, onGo }: { pages: readonly StudyPage[]; onGo: () => void }) {
  const panel = usePanelStyles();
  return pages.map((page) => (
    <PageLink
      key={page.path}
      page={page}
      className={mergeClasses(panel.item, page.current && panel.here)}
      onGo={onGo}
    />
  ));
}
