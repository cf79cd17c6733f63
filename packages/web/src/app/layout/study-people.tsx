import { makeStyles } from '@fluentui/react-components';
import { useQuery } from '@tanstack/react-query';
import { studyQuery } from '../../features/studies/api/studies';
import { Hint } from '../../shared/ui/hint';
import { Initials } from '../../shared/ui/initials';
import { onBar } from '../../shared/ui/own-tokens';

const useStyles = makeStyles({
  people: {
    display: 'flex',
    '@media (max-width: 900px)': { display: 'none' },
  },
  person: {
    display: 'block',
    borderRadius: '50%',
    marginLeft: '-6px',
    ':focus-visible': { outline: `2px solid ${onBar.text}`, position: 'relative', zIndex: 1 },
  },
});

/** The study's members as initials, each with name and role. */
export function StudyPeople({ studyId }: { studyId: string }) {
  const styles = useStyles();
  const { data: study } = useQuery(studyQuery(studyId));
  return (
    <ul className={styles.people} aria-label="People in this study">
      {study?.members.map(({ person, role }, index) => (
        <li key={person.id}>
          <Hint says={`${person.name}, ${role}`} relationship="label" className={styles.person}>
            <Initials name={person.name} tone={index} />
          </Hint>
        </li>
      ))}
    </ul>
  );
}
