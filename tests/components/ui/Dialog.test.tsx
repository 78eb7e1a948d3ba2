import { fireEvent, render, screen, waitFor } from '@testing-library/react';
import { useState } from 'react';
import { Button } from '@/components/ui/Button';
import { ConfirmDialog } from '@/components/ui/ConfirmDialog';
import { Dialog } from '@/components/ui/Dialog';

function Bench() {
  const [open, setOpen] = useState(false);
  return (
    <>
      <Button label="Share" onPress={() => setOpen(true)} />
      {open ? (
        <Dialog title="Share the study" open onClose={() => setOpen(false)}>
          <Button label="Send" />
        </Dialog>
      ) : null}
    </>
  );
}

test('is a dialog by name, takes the focus, and Esc closes it', async () => {
  render(<Bench />);
  fireEvent.click(screen.getByRole('button', { name: 'Share' }));
  const dialog = await screen.findByRole('dialog', { name: 'Share the study' });
  await waitFor(() => expect(dialog.contains(document.activeElement)).toBe(true));
  fireEvent.keyUp(document, { key: 'Escape' });
  await waitFor(() => expect(screen.queryByRole('dialog')).toBeNull());
});

test('what fails is told in the dialog, which stays open; once it works it closes', async () => {
  const close = jest.fn();
  const remove = jest
    .fn()
    .mockRejectedValueOnce(new Error('down'))
    .mockResolvedValueOnce(undefined);
  render(
    <ConfirmDialog title="Remove?" confirm="Remove" onConfirm={remove} onClose={close}>
      It is gone then.
    </ConfirmDialog>,
  );
  fireEvent.click(screen.getByRole('button', { name: 'Remove' }));
  expect(await screen.findByRole('alert')).toBeTruthy();
  expect(close).not.toHaveBeenCalled();
  fireEvent.click(screen.getByRole('button', { name: 'Remove' }));
  await waitFor(() => expect(close).toHaveBeenCalledTimes(1));
});
