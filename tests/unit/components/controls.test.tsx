import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { Button } from '@/components/ui/button';
import { Checkbox } from '@/components/ui/checkbox';
import { TextField } from '@/components/ui/field';
import { FileDrop, judgeFile } from '@/components/ui/file-drop';
import { FilterChips } from '@/components/ui/filter-chips';
import { Progress } from '@/components/ui/progress';
import { StateTrack } from '@/components/ui/state-track';

afterEach(cleanup);

describe('a button', () => {
  it('cannot be pressed twice while its work is under way, and says that it is busy', async () => {
    const onClick = vi.fn();
    const submitted = vi.fn((event: React.FormEvent) => event.preventDefault());
    render(
      <form onSubmit={submitted}>
        <Button type="submit" pending onClick={onClick}>
          Submit roster
        </Button>
      </form>,
    );
    const button = screen.getByRole('button', { name: 'Submit roster' });
    await userEvent.click(button);
    expect(onClick).not.toHaveBeenCalled();
    expect(submitted).not.toHaveBeenCalled();
    expect(button.getAttribute('aria-busy')).toBe('true');
  });

  it('that is unavailable can still be reached, and its name holds the reason', async () => {
    const onClick = vi.fn();
    render(
      <Button unavailable="Put 3 blockers right first" onClick={onClick}>
        Submit roster
      </Button>,
    );
    await userEvent.tab();
    const button = screen.getByRole('button', { name: /Submit roster.*Put 3 blockers right first/ });
    expect(document.activeElement).toBe(button);
    await userEvent.keyboard('{Enter}');
    expect(onClick).not.toHaveBeenCalled();
  });
});

describe('a field', () => {
  it('is named by its label and read out with its hint and its error', () => {
    render(
      <TextField label="E-mail" hint="Where invitations go." error="Write a whole address." name="email" />,
    );
    const input = screen.getByLabelText('E-mail');
    const read = (input.getAttribute('aria-describedby') ?? '')
      .split(' ')
      .map((id) => document.getElementById(id)?.textContent);
    expect(read).toEqual(['Where invitations go.', 'Write a whole address.']);
    expect(input.getAttribute('aria-invalid')).toBe('true');
  });

  it('without hint and error points at nothing', () => {
    render(<TextField label="Name" name="name" />);
    const input = screen.getByLabelText('Name');
    expect(input.hasAttribute('aria-describedby')).toBe(false);
    expect(input.hasAttribute('aria-invalid')).toBe(false);
  });

  it('a checkbox is ticked by its words', async () => {
    render(<Checkbox label="Names on the back" name="names" />);
    await userEvent.click(screen.getByText('Names on the back'));
    expect(screen.getByRole<HTMLInputElement>('checkbox').checked).toBe(true);
  });
});

describe('a file drop', () => {
  const accepts = ['.csv', '.xlsx'];
  const judge = (name: string, size: number) => judgeFile({ name, size }, accepts, 5_000_000);

  it('takes the endings it names in any case, up to the limit', () => {
    expect(judge('roster.csv', 5_000_000)).toBeNull();
    expect(judge('ROSTER.XLSX', 10)).toBeNull();
  });

  it('says why it refuses a file and what to do', () => {
    expect(judge('roster.pdf', 10)).toBe(
      'roster.pdf is not one of CSV, XLSX. Save the list as one of these and add it again.',
    );
    expect(judge('roster.csv', 0)).toMatch(/is empty/);
    expect(judge('roster.csv', 5_000_001)).toMatch(/is larger than 5 MB, the most we take/);
  });

  it('hands over a good file, and shows the refusal of a bad one beside itself', async () => {
    const onFile = vi.fn();
    render(
      <FileDrop
        label="Drop a roster here, or pick a file"
        accepts={accepts}
        maxBytes={100}
        file={null}
        onFile={onFile}
      />,
    );
    const input = screen.getByLabelText(/Drop a roster here/);
    const good = new File(['name,number'], 'otters.csv');
    await userEvent.upload(input, good);
    expect(onFile).toHaveBeenLastCalledWith(good);
    await userEvent.upload(input, new File(['x'.repeat(200)], 'long.csv'));
    expect(onFile).toHaveBeenLastCalledWith(null);
    expect(screen.getByText(/long.csv is larger than 100 bytes, the most we take/)).toBeTruthy();
  });
});

it('filter chips say which one is chosen and how many each keeps', async () => {
  const onChoose = vi.fn();
  render(
    <FilterChips
      label="State"
      chosen="all"
      onChoose={onChoose}
      chips={[
        { id: 'all', label: 'All', count: 32 },
        { id: 'blocked', label: 'Blocked', count: 6 },
      ]}
    />,
  );
  expect(screen.getByRole('button', { name: 'All 32' }).getAttribute('aria-pressed')).toBe('true');
  await userEvent.click(screen.getByRole('button', { name: 'Blocked 6' }));
  expect(onChoose).toHaveBeenCalledWith('blocked');
});

it('progress says its count in words', () => {
  render(<Progress label="Making bag labels" done={132} total={192} unit="labels" />);
  const bar = screen.getByRole('progressbar', { name: 'Making bag labels' });
  expect(bar.getAttribute('aria-valuetext')).toBe('132 of 192 labels');
});

it('a state track says in words what is passed, what is now and what is to come', () => {
  render(
    <StateTrack
      label="States"
      current="on press"
      steps={['released', 'on press', 'packed'].map((id) => ({ id, label: id }))}
    />,
  );
  expect(screen.getAllByRole('listitem').map((item) => item.textContent)).toEqual([
    'released, passed',
    'on press, now',
    'packed, still to come',
  ]);
});
