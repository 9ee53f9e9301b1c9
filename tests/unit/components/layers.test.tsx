import { cleanup, render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { Button } from '@/components/ui/button';
import { ConfirmDialog } from '@/components/ui/confirm-dialog';
import { Dialog } from '@/components/ui/dialog';
import { ToastProvider, useToast } from '@/components/ui/toast';
import { YokeTile } from '@/components/yoke-tile/yoke-tile';

afterEach(cleanup);

function ask(onConfirm: () => void | string | Promise<void | string>) {
  render(
    <ConfirmDialog
      title="Discard batch B-07?"
      confirm="Discard batch B-07"
      onConfirm={onConfirm}
      trigger={<Button>Discard</Button>}
    >
      The choice of 8 teams is lost.
    </ConfirmDialog>,
  );
}

describe('a question before something is lost', () => {
  it('names what is lost, starts on the safe answer, and does nothing when it is left', async () => {
    const onConfirm = vi.fn();
    ask(onConfirm);
    await userEvent.click(screen.getByRole('button', { name: 'Discard' }));
    expect(screen.getByRole('alertdialog').textContent).toContain('The choice of 8 teams is lost.');
    await waitFor(() => expect(document.activeElement?.textContent).toBe('Keep it'));
    await userEvent.keyboard('{Escape}');
    await waitFor(() => expect(screen.queryByRole('alertdialog')).toBeNull());
    expect(onConfirm).not.toHaveBeenCalled();
  });

  it('closes when the work is done', async () => {
    ask(async () => {});
    await userEvent.click(screen.getByRole('button', { name: 'Discard' }));
    await userEvent.click(screen.getByRole('button', { name: 'Discard batch B-07' }));
    await waitFor(() => expect(screen.queryByRole('alertdialog')).toBeNull());
  });

  it('stays open and shows the sentence when the answer is a refusal or nothing came back', async () => {
    const onConfirm = vi.fn<() => Promise<string>>();
    onConfirm
      .mockResolvedValueOnce('The batch was released a minute ago.')
      .mockRejectedValueOnce(new Error('lost'));
    ask(onConfirm);
    await userEvent.click(screen.getByRole('button', { name: 'Discard' }));
    await userEvent.click(screen.getByRole('button', { name: 'Discard batch B-07' }));
    expect((await screen.findByRole('alert')).textContent).toContain('The batch was released a minute ago.');
    await userEvent.click(screen.getByRole('button', { name: 'Discard batch B-07' }));
    await waitFor(() => expect(screen.getByRole('alert').textContent).toContain('Nothing was changed'));
  });
});

it('a dialog closes with Escape and gives the focus back to its button', async () => {
  render(
    <Dialog title="Return the roster" trigger={<Button>Return it</Button>}>
      Say why.
    </Dialog>,
  );
  const button = screen.getByRole('button', { name: 'Return it' });
  await userEvent.click(button);
  expect(screen.getByRole('dialog', { name: 'Return the roster' })).toBeTruthy();
  await userEvent.keyboard('{Escape}');
  await waitFor(() => expect(document.activeElement).toBe(button));
});

it('a toast can be answered with its action once', async () => {
  const undo = vi.fn();
  const Show = () => {
    const showToast = useToast();
    return (
      <Button
        onClick={() =>
          showToast({ tone: 'set', title: 'Saved 12 players', action: { label: 'Undo', onSelect: undo } })
        }
      >
        Save
      </Button>
    );
  };
  render(
    <ToastProvider>
      <Show />
    </ToastProvider>,
  );
  await userEvent.click(screen.getByRole('button', { name: 'Save' }));
  await userEvent.click(await screen.findByRole('button', { name: 'Undo' }));
  expect(undo).toHaveBeenCalledTimes(1);
  await waitFor(() => expect(screen.queryByRole('button', { name: 'Undo' })).toBeNull());
});

describe('a yoke tile', () => {
  const kit = { body: '#14375e', sleeves: '#d8dde1', number: '#ffffff', outline: '#000000' };

  it('shows the team’s own colours, untouched by the theme', () => {
    const { container } = render(<YokeTile kit={kit} number="7" />);
    expect([...container.querySelectorAll('path')].map((path) => path.getAttribute('fill'))).toEqual([
      '#d8dde1',
      '#d8dde1',
      '#14375e',
    ]);
    expect(container.querySelector('text')?.getAttribute('fill')).toBe('#ffffff');
    expect(container.querySelector('text')?.getAttribute('stroke')).toBe('#000000');
  });

  it('is named when no words stand beside it, and hidden otherwise', () => {
    const { container } = render(<YokeTile kit={kit} />);
    expect(container.querySelector('svg')?.getAttribute('aria-hidden')).toBe('true');
    cleanup();
    render(<YokeTile kit={kit} number="7" label="Otters, home" />);
    expect(screen.getByRole('img', { name: 'Otters, home, number 7' })).toBeTruthy();
  });
});
