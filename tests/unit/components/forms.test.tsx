import { act, cleanup, render, renderHook, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { ReservedEditor } from '@/app/[league]/number-rules/_components/reserved-editor';
import { useListSource, type Taken } from '@/app/[league]/[season]/_components/use-list-source';
import { FormFailure } from '@/app/_components/form-failure';
import { useSubmit } from '@/app/_components/use-submit';
import { FileDrop } from '@/components/ui/file-drop';
import type { Reserved } from '@/lib/domain/rules/rule-set';

afterEach(cleanup);

/** A promise and what settles it. */
function defer<T>() {
  let settle: (value: T) => void = () => undefined;
  let fail: () => void = () => undefined;
  const promise = new Promise<T>((resolve, reject) => {
    settle = resolve;
    fail = () => reject(new TypeError('failed to fetch'));
  });
  return { promise, settle, fail };
}

describe('sending a form', () => {
  it('stays busy after a success that leads to another page, so that nothing is sent twice', async () => {
    const action = vi.fn().mockResolvedValue({ ok: true, data: null });
    const { result } = renderHook(() => useSubmit(action, () => 'leaving'));
    await act(() => result.current.submit());
    await act(() => result.current.submit());
    expect(result.current.pending).toBe(true);
    expect(action).toHaveBeenCalledTimes(1);
  });

  it('can be sent again after a success that stays on the page, and after a lost connection', async () => {
    const action = vi
      .fn()
      .mockRejectedValueOnce(new TypeError('failed to fetch'))
      .mockResolvedValue({ ok: true, data: null });
    const { result } = renderHook(() => useSubmit(action, () => undefined));
    await act(() => result.current.submit());
    expect(result.current.failure?.message).toMatch(/did not reach the server/);
    await act(() => result.current.submit());
    expect(result.current).toMatchObject({ pending: false, failure: undefined });
    expect(action).toHaveBeenCalledTimes(2);
  });

  it('says every sentence itself where no input could show it, and only counts them where inputs do', () => {
    const failure = { message: 'Not taken.', fields: { teams: 'Import at most 500 teams at a time.' } };
    const { rerender } = render(<FormFailure failure={failure} inputs={false} />);
    expect(screen.getByText('Import at most 500 teams at a time.')).toBeTruthy();
    rerender(<FormFailure failure={failure} />);
    expect(screen.getByText(/One field needs another look/)).toBeTruthy();
  });
});

describe('a list that is brought', () => {
  const open = () => {
    const answers = new Map<string, ReturnType<typeof defer<Taken<string>>>>();
    const lists: (string | null)[] = [];
    const hook = renderHook(() =>
      useListSource<string>(
        {
          file: (file) => {
            const answer = defer<Taken<string>>();
            answers.set(file.name, answer);
            return answer.promise;
          },
          paste: (text) => (text === '' ? { ok: false, message: 'Nothing here.' } : { ok: true, list: text }),
        },
        (list) => lists.push(list),
      ),
    );
    return { answers, lists, shown: () => hook.result.current.shown };
  };
  const file = (name: string) => new File(['x'], name);

  it('is the one picked last, whichever answer comes last', async () => {
    const { answers, lists, shown } = open();
    act(() => shown().onFile(file('a.xlsx')));
    act(() => shown().onFile(file('b.csv')));
    await act(async () => answers.get('b.csv')?.settle({ ok: true, list: 'b' }));
    await act(async () => answers.get('a.xlsx')?.settle({ ok: true, list: 'a' }));
    expect(lists.at(-1)).toBe('b');
    expect(shown()).toMatchObject({ busy: false, file: { name: 'b.csv' }, refusal: undefined });
  });

  it('is gone when the file is taken out, together with why it was refused', async () => {
    const { answers, lists, shown } = open();
    act(() => shown().onFile(file('a.csv')));
    await act(async () => answers.get('a.csv')?.settle({ ok: false, message: 'No list.' }));
    expect(shown().refusal).toBe('No list.');
    act(() => shown().onFile(null));
    expect(shown()).toMatchObject({ file: null, refusal: undefined, busy: false });
    act(() => shown().onFile(file('b.csv')));
    await act(async () => answers.get('b.csv')?.settle({ ok: true, list: 'b' }));
    expect(lists.at(-1)).toBe('b');
    act(() => shown().onFile(null));
    expect(lists.at(-1)).toBeNull();
  });

  it('is refused with what to do when the file does not reach the server, and a paste after it counts', async () => {
    const { answers, lists, shown } = open();
    act(() => shown().onFile(file('a.csv')));
    await act(async () => answers.get('a.csv')?.fail());
    await waitFor(() => expect(shown().refusal).toMatch(/pick it again/));
    act(() => shown().onText('4 Adisa'));
    act(() => shown().onReadPaste());
    expect(lists.at(-1)).toBe('4 Adisa');
    expect(shown()).toMatchObject({ file: null, refusal: undefined });
  });

  it('can be picked again under the same name', async () => {
    const onFile = vi.fn();
    render(<FileDrop label="Pick a file" accepts={['.csv']} maxBytes={10} file={null} onFile={onFile} />);
    const input = screen.getByLabelText<HTMLInputElement>('Pick a file');
    await userEvent.upload(input, file('a.csv'));
    expect(onFile).toHaveBeenCalledTimes(1);
    expect(input.value).toBe('');
  });
});

describe('numbers set aside', () => {
  it('keeps each role with its number when a line is removed, and a comma just typed', async () => {
    const seen: Reserved[][] = [];
    function Screen() {
      const [reserved, setReserved] = useState<Reserved[]>([
        { labels: '1', roles: ['goalkeeper'], reason: '' },
        { labels: '99', roles: ['captain'], reason: '' },
      ]);
      seen.push(reserved);
      return <ReservedEditor reserved={reserved} error={undefined} onChange={setReserved} />;
    }
    render(<Screen />);
    await userEvent.click(screen.getByRole('button', { name: 'Remove 1' }));
    const roles = screen.getByLabelText<HTMLInputElement>(/Only for/);
    expect(roles.value).toBe('captain');
    await userEvent.type(roles, ', libero');
    expect(roles.value).toBe('captain, libero');
    expect(seen.at(-1)).toEqual([{ labels: '99', roles: ['captain', 'libero'], reason: '' }]);
  });
});
