import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { IssuePanel } from '~/islands/bench/IssuePanel';
import { Query } from '~/islands/shared/query';

afterEach(cleanup);
const panel = (waitsFor: string | null) =>
  render(
    <Query>
      <IssuePanel
        tankId="t"
        letter="B"
        waitsFor={waitsFor}
        onIssued={() => {}}
        onClose={() => {}}
      />
    </Query>,
  );
const button = () => screen.getByRole<HTMLButtonElement>('button', { name: 'Issue B' });

describe('issuing a revision', () => {
  it('waits until the server has all that is shown, and says for what', () => {
    panel('The settings are not saved yet: no answer.');
    expect(button().disabled).toBe(true);
    expect(screen.getByRole('status').textContent).toContain('The settings are not saved yet');
  });

  it('is offered once all is saved', () => {
    panel(null);
    expect(button().disabled).toBe(false);
  });
});
