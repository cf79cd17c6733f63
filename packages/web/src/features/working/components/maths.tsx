import { makeStyles } from '@fluentui/react-components';
import { Suspense, use } from 'react';
import './maths.css';

type Typeset = (tex: string) => string;

const useStyles = makeStyles({
  maths: {
    '& math': {
      width: 'fit-content',
      fontFamily: '"Steelyard Maths", math',
      fontSize: '17px',
      textAlign: 'start',
    },
  },
});

let loading: Promise<Typeset> | undefined;

/** KaTeX as MathML: its other output needs inline styles, which the content security policy forbids. */
function typesetter(): Promise<Typeset> {
  loading ??= import('katex').then(
    ({ default: katex }) =>
      (tex) =>
        spaced(katex.renderToString(tex, { output: 'mathml', displayMode: true, throwOnError: false })),
  );
  return loading;
}

/** “log 0.7”: browsers set a function's name and what it is of without the thin space between. */
const spaced = (mathml: string) =>
  mathml.replace(/<mo>\u2061<\/mo>(?=<m[in])/g, '$&<mspace width="0.1667em"/>');

/** A formula, typeset; its source until the typesetter has arrived. */
export function Maths({ tex }: { tex: string }) {
  return (
    <Suspense fallback={<code>{tex}</code>}>
      <Typeset tex={tex} />
    </Suspense>
  );
}

function Typeset({ tex }: { tex: string }) {
  const styles = useStyles();
  const typeset = use(typesetter());
  // KaTeX escapes what it is given, and gets our own formulas alone.
  return <div className={styles.maths} dangerouslySetInnerHTML={{ __html: typeset(tex) }} />;
}
