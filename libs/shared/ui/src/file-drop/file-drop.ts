import { ChangeDetectionStrategy, Component, computed, input, output, signal } from '@angular/core';
import { Icon } from '../icons/icon';

/** What a file must be: endings with their dot, and its size in bytes at most. */
export interface FileLimits {
  readonly endings: readonly string[];
  readonly maxBytes: number;
}

let made = 0;

/** Takes one file, dropped or chosen. What can't be right by ending or size is refused here, with the reason. */
@Component({
  selector: 'sw-file-drop',
  imports: [Icon],
  templateUrl: './file-drop.html',
  styleUrl: './file-drop.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class FileDrop {
  /** What is asked for: "Order sheet". */
  readonly label = input.required<string>();
  readonly limits = input.required<FileLimits>();
  /** How much is sent, in per cent; null when nothing is under way. */
  readonly progress = input<number | null>(null);
  /** What the server said against the file. */
  readonly error = input('');
  readonly picked = output<File>();

  protected readonly inputId = `sw-file-${++made}`;
  protected readonly over = signal(false);
  protected readonly fileName = signal('');
  protected readonly refusal = signal('');
  protected readonly problem = computed(() => this.refusal() || this.error());
  protected readonly accept = computed(() => this.limits().endings.join(','));
  protected readonly hint = computed(() => {
    const endings = this.limits().endings.join(', ');
    return $localize`:@@ui.file.hint:${endings}:endings: up to ${megabytes(this.limits().maxBytes)}:size: MB`;
  });

  protected choose(event: Event): void {
    const field = event.target as HTMLInputElement;
    this.take(field.files);
    // The same file can be chosen again after it was mended.
    field.value = '';
  }

  protected drop(event: DragEvent): void {
    event.preventDefault();
    this.over.set(false);
    if (this.progress() === null) {
      this.take(event.dataTransfer?.files);
    }
  }

  protected dragOver(event: DragEvent): void {
    event.preventDefault();
    this.over.set(true);
  }

  private take(files: FileList | null | undefined): void {
    const file = files?.[0];
    if (file === undefined) {
      return;
    }
    this.fileName.set(file.name);
    this.refusal.set(files !== null && files !== undefined && files.length > 1 ? onlyOne : this.faultOf(file));
    if (this.refusal() === '') {
      this.picked.emit(file);
    }
  }

  private faultOf(file: File): string {
    const { endings, maxBytes } = this.limits();
    if (!endings.some((ending) => file.name.toLowerCase().endsWith(ending))) {
      return $localize`:@@ui.file.ending:This is not a file that ends in ${endings.join(', ')}:endings:.`;
    }
    if (file.size > maxBytes) {
      return $localize`:@@ui.file.size:The file is larger than ${megabytes(maxBytes)}:size: MB.`;
    }
    return file.size === 0 ? $localize`:@@ui.file.empty:The file is empty.` : '';
  }
}

const onlyOne = $localize`:@@ui.file.onlyOne:Please drop one file at a time.`;

function megabytes(bytes: number): number {
  return Math.floor(bytes / 1_000_000);
}
