import type { Disposable, Uri } from 'vscode';
import { failed } from '../failed';
import type { Log } from '../log';
import type { Comparison } from './comparison';
import { asComputed, type FileState } from './fileState';
import { watchFiles } from './fileWatch';

/** Saving tells of itself several times at once. */
const LOOK_AFTER_MS = 200;

/** The files of a comparison: whether they are still as they were computed from, and where they went. */
export class FollowedFiles implements Disposable {
  private watch: Disposable | null = null;
  private readonly shown: Disposable;
  private current: FileState = asComputed;
  private isLooking = false;

  constructor(
    private readonly comparison: Comparison,
    private readonly log: Log,
    private readonly onState: () => void,
  ) {
    this.shown = comparison.onDidShow(() => {
      this.current = asComputed;
      this.lookSoon(); // what befell the files while it was computed has been told already
    });
  }

  get state(): FileState {
    return this.current;
  }

  /** Follows the files of the comparison as they are named now. */
  follow(onRenamed: (index: number, to: Uri) => void): void {
    this.watch?.dispose();
    this.watch = watchFiles(this.comparison.subject.files, () => this.lookSoon(), onRenamed);
  }

  /** Sees whether the files are still as they were computed from. */
  async look(): Promise<FileState> {
    const { comparison } = this;
    const { shown } = comparison;
    const state = await comparison.filesNow();
    const isNews = JSON.stringify(state) !== JSON.stringify(this.current);
    if (this.watch !== null && shown === comparison.shown && isNews) {
      this.current = state;
      this.onState();
    }
    return this.current;
  }

  dispose(): void {
    this.watch?.dispose();
    this.watch = null;
    this.shown.dispose();
  }

  /** Looks, once at a time; what is edited stays so until it is saved or computed anew. */
  private lookSoon(): void {
    if (this.isLooking) return;
    this.isLooking = true;
    setTimeout(() => {
      this.isLooking = false;
      this.look().catch((error: unknown) => failed('panel', error, this.log));
    }, LOOK_AFTER_MS);
  }
}
