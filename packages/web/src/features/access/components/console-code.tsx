import { Button, makeStyles } from '@fluentui/react-components';
import { zodResolver } from '@hookform/resolvers/zod';
import { type FirstVisit, firstVisitSchema } from '@steelyard/api/contract/access';
import { useForm } from 'react-hook-form';
import { Form, TextField } from '../../../shared/ui/form';

const useStyles = makeStyles({ told: { marginBottom: '18px' } });

/** Before anyone has an account: the code that the server printed leads to the first one. */
export function ConsoleCode({ onCode }: { onCode: (code: string) => void }) {
  const styles = useStyles();
  const { control, handleSubmit } = useForm<Pick<FirstVisit, 'code'>>({
    resolver: zodResolver(firstVisitSchema.pick({ code: true })),
    defaultValues: { code: '' },
  });
  const submit = handleSubmit(({ code }) => onCode(code));
  return (
    <div>
      <p className={styles.told}>
        Nobody has an account on this installation yet. An administrator has to be created first: open the
        link that the server printed on its console when it started, or enter the code in it here.
      </p>
      <Form label="Enter the code" fault={undefined} onSubmit={() => void submit()}>
        <TextField
          label="Code from the server’s console"
          autoComplete="one-time-code"
          control={control}
          name="code"
        />
        <div>
          <Button type="submit" appearance="primary">
            Go on
          </Button>
        </div>
      </Form>
    </div>
  );
}
