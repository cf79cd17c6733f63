import { Button, makeStyles, tokens } from '@fluentui/react-components';
import type { Scene } from '../../../charts/scene/marks';

const useStyles = makeStyles({
  row: {
    display: 'flex',
    flexWrap: 'wrap',
    alignItems: 'center',
    gap: '2px',
    color: tokens.colorNeutralForeground2,
    fontSize: '13px',
    '@media print': { display: 'none' },
  },
  button: { minWidth: 0, padding: '0 6px', fontWeight: 400, color: tokens.colorBrandForeground1 },
});

interface ExportsProps {
  /** The first part of the files' names. */
  name: string;
  title: string;
  finding: string;
  scene: () => Scene | null;
  csv: () => Promise<string>;
}

/** The picture and its figures as files. */
export function Exports({ name, title, finding, scene, csv }: ExportsProps) {
  const styles = useStyles();
  const picture = (write: (drawn: Scene) => Promise<Blob | null>) => async (ending: string) => {
    const drawn = scene();
    const file = drawn && (await write(drawn));
    if (file) download(file, `${name}.${ending}`);
  };
  const kinds = {
    SVG: picture(async (drawn) => {
      const { writeSvg } = await import('../../../charts/draw/write-svg');
      const text = writeSvg(drawn, { title, description: finding });
      return new Blob([text], { type: 'image/svg+xml' });
    }),
    PNG: picture(pngOf),
    CSV: async (ending: string) =>
      download(new Blob([await csv()], { type: 'text/csv;charset=utf-8' }), `${name}.${ending}`),
  };
  return (
    // biome-ignore lint/a11y/useSemanticElements: a fieldset is for forms.
    <div role="group" aria-label="Save as a file" className={styles.row}>
      <span>Save as</span>
      {Object.entries(kinds).map(([kind, save]) => (
        <Button
          key={kind}
          size="small"
          appearance="subtle"
          className={styles.button}
          onClick={() => void save(kind.toLowerCase())}
        >
          {kind}
        </Button>
      ))}
    </div>
  );
}

/** Three times the size on the screen, for print. */
async function pngOf(scene: Scene): Promise<Blob | null> {
  const { drawScene } = await import('../../../charts/draw/draw-scene');
  const canvas = document.createElement('canvas');
  canvas.width = 3 * scene.width;
  canvas.height = 3 * scene.height;
  const pen = canvas.getContext('2d');
  if (!pen) return null;
  pen.scale(3, 3);
  drawScene(pen, scene);
  return new Promise((resolve) => canvas.toBlob(resolve, 'image/png'));
}

function download(file: Blob, name: string): void {
  const address = URL.createObjectURL(file);
  const link = document.createElement('a');
  link.href = address;
  link.download = name;
  link.click();
  // The browser reads the file after the click has been handled.
  setTimeout(() => URL.revokeObjectURL(address), 10_000);
}
