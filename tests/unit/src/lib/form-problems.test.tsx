import { zodResolver } from '@hookform/resolvers/zod';
import { screen } from '@testing-library/react';
import { useForm } from 'react-hook-form';
import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import { ApiProblem } from '#src/lib/api-problem.js';
import { useFormProblems } from '#src/lib/form-problems.js';
import { TextField } from '#src/ui/field.js';
import { renderOnBoard } from '#tests/support/on-board.js';

const schema = z.object({ name: z.string().min(1, 'required'), skyline: z.string() });
const FIELDS = ['name', 'skyline'] as const;

function Form({ refusal }: { refusal?: ApiProblem }) {
  const form = useForm({
    resolver: zodResolver(schema),
    defaultValues: { name: '', skyline: '60 : thirty' },
  });
  const problems = useFormProblems(form, FIELDS);
  const submit = () => {
    if (refusal) problems.show(refusal);
  };
  return (
    <form
      onSubmit={(event) => {
        void form.handleSubmit(submit)(event);
      }}
    >
      {problems.overall !== undefined && <p role="alert">{problems.overall}</p>}
      <TextField {...form.register('name')} label="Name" problem={problems.at('name')} />
      <TextField {...form.register('skyline')} label="Skyline" problem={problems.at('skyline')} />
      <button>Save</button>
    </form>
  );
}

const refused = (errors: ApiProblem['errors']) =>
  new ApiProblem({ slug: 'invalid-input', status: 422, detail: '', errors });

describe('refusals of a form', () => {
  it('turn the codes of the schema into sentences at their fields and lead the focus there', async () => {
    const { user } = await renderOnBoard(<Form />);
    await user.click(screen.getByText('Save'));
    const name = screen.getByLabelText('Name');
    expect(name.getAttribute('aria-invalid')).toBe('true');
    expect(document.getElementById(name.getAttribute('aria-describedby') ?? '')?.textContent).toBe(
      'Fill this in.',
    );
    expect(document.activeElement).toBe(name);
  });

  it('of the server stand at their fields, those of a part at the whole, and nothing typed is lost', async () => {
    const errors = [{ field: 'skyline.1.altitudeDeg', code: 'altitude-range', message: 'server words' }];
    const { user } = await renderOnBoard(<Form refusal={refused(errors)} />);
    await user.type(screen.getByLabelText('Name'), 'Upper terraces');
    await user.click(screen.getByText('Save'));
    expect(await screen.findByText('A skyline altitude lies between −5 and 60 degrees.')).toBeDefined();
    expect(screen.getByLabelText<HTMLInputElement>('Name').value).toBe('Upper terraces');
    expect(screen.getByLabelText<HTMLInputElement>('Skyline').value).toBe('60 : thirty');
    expect(document.activeElement).toBe(screen.getByLabelText('Skyline'));
  });

  it('with a code that no text is written for keep the sentence of the server', async () => {
    const errors = [{ field: 'name', code: 'brand-new-code', message: 'Two names are the same.' }];
    const { user } = await renderOnBoard(<Form refusal={refused(errors)} />);
    await user.type(screen.getByLabelText('Name'), 'x');
    await user.click(screen.getByText('Save'));
    expect(await screen.findByText('Two names are the same.')).toBeDefined();
  });

  it('of a field that is not on screen, or without any field, stand over the form', async () => {
    const errors = [{ field: 'version', code: 'required', message: 'x' }];
    const first = await renderOnBoard(<Form refusal={refused(errors)} />);
    await first.user.type(screen.getByLabelText('Name'), 'x');
    await first.user.click(screen.getByText('Save'));
    expect((await screen.findByRole('alert')).textContent).toBe('Fill this in.');
    first.unmount();
    const offline = new ApiProblem({ slug: 'offline', status: 0, detail: '' });
    const second = await renderOnBoard(<Form refusal={offline} />);
    await second.user.type(screen.getByLabelText('Name'), 'x');
    await second.user.click(screen.getByText('Save'));
    expect((await screen.findByRole('alert')).textContent).toContain('There is no network just now.');
  });
});
