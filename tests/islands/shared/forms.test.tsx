import { cleanup, fireEvent, render, screen, waitFor, within } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { SignIn } from '~/islands/sign-in/SignIn';
import { SignUp } from '~/islands/sign-up/SignUp';
import { problem } from './answers';

const fetch = vi.fn<(...args: unknown[]) => Promise<Response>>();
vi.stubGlobal('fetch', fetch);
afterEach(() => {
  cleanup();
  fetch.mockReset();
  localStorage.clear();
});

const type = (label: string, value: string) =>
  fireEvent.change(screen.getByLabelText(label), { target: { value } });
const press = (name: string) => fireEvent.click(screen.getByRole('button', { name }));

describe('forms', () => {
  it('checks in the browser: the fault stands beside its field, the summary takes focus and leads there', async () => {
    render(<SignIn next="/home" />);
    type('E-mail', 'nobody');
    press('Sign in');
    const summary = await screen.findByRole('alert');
    await waitFor(() => expect(document.activeElement).toBe(summary));
    expect(fetch).not.toHaveBeenCalled();

    const email = screen.getByLabelText('E-mail');
    expect(email.getAttribute('aria-invalid')).toBe('true');
    const beside = document.getElementById(email.getAttribute('aria-describedby')!)!;
    expect(beside.textContent).toBe('Give an e-mail address such as name@firm.example.');
    expect(within(summary).getByText('2 things to put right')).toBeDefined();
    fireEvent.click(within(summary).getByText('Type your password.'));
    expect(document.activeElement).toBe(screen.getByLabelText('Password'));
  });

  it('shows a refusal without a field in the summary and keeps what was typed', async () => {
    fetch.mockResolvedValueOnce(
      problem(401, { code: 'unauthenticated', detail: 'Address or password is wrong.' }),
    );
    render(<SignIn next="/home" />);
    type('E-mail', 'fitter@tarnside.example');
    type('Password', 'wrong');
    press('Sign in');
    const summary = await screen.findByRole('alert');
    expect(within(summary).getByText('Address or password is wrong.')).toBeDefined();
    await waitFor(() => expect(document.activeElement).toBe(summary));
    expect((screen.getByLabelText('Password') as HTMLInputElement).value).toBe('wrong');
  });

  it('puts the faults of the server beside the fields they point at, and never drops one', async () => {
    fetch.mockResolvedValueOnce(
      problem(422, {
        code: 'invalid',
        detail: 'Two fields are wrong.',
        errors: [
          { pointer: '/email', detail: 'There is an account with this address: sign in.' },
          { pointer: '/elsewhere', detail: 'Something this form does not show.' },
        ],
      }),
    );
    render(<SignUp />);
    type('Workshop', 'Fellside Cabins');
    type('Your name', 'Ada Stone');
    type('E-mail', 'ada@fellside.example');
    type('Password', 'a dozen or more');
    press('Open the workshop');
    const summary = await screen.findByRole('alert');
    expect(within(summary).getByText('Something this form does not show.')).toBeDefined();
    const email = screen.getByLabelText('E-mail');
    expect(document.getElementById(email.getAttribute('aria-describedby')!)!.textContent).toBe(
      'There is an account with this address: sign in.',
    );
  });
});
