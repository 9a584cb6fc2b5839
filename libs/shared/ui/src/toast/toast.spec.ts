import { TestBed } from '@angular/core/testing';
import { MatSnackBar } from '@angular/material/snack-bar';
import { Toast } from './toast';

/** The bar once it is open: it is opened after its code was fetched. */
async function opened() {
  const bar = TestBed.inject(MatSnackBar);
  while (bar._openedSnackBarRef === null) {
    await new Promise((resolve) => setTimeout(resolve));
  }
  return bar._openedSnackBarRef;
}

describe('Toast', () => {
  it('answers whether its act was pressed', async () => {
    const pressed = TestBed.inject(Toast).show({ text: 'Line removed', act: 'Undo' });
    (await opened()).dismissWithAction();

    expect(await pressed).toBe(true);
  });

  it('answers no when it goes away', async () => {
    const gone = TestBed.inject(Toast).show({ text: 'Line removed', act: 'Undo' });
    const bar = await opened();
    expect(document.body.textContent).toContain('Line removed');
    bar.dismiss();

    expect(await gone).toBe(false);
  });
});
