import { existsSync } from 'node:fs';
import { basename, dirname, extname, join } from 'node:path';
import { type BrowserWindow, dialog } from 'electron';
import { done } from '../../core/problem';
import type { Places } from '../files/places';
import { suggestedFileName } from '../files/scenarioNames';

const filters = [{ name: 'Sunder scenario', extensions: ['sunder.json', 'json'] }];

/** Places chosen in the dialogs of the system. */
export const dialogPlaces = (window: () => BrowserWindow, startFolder: string): Places => ({
  toOpen: async () => {
    const { canceled, filePaths } = await dialog.showOpenDialog(window(), {
      title: 'Open scenario',
      defaultPath: startFolder,
      filters,
      properties: ['openFile'],
    });
    const [path] = filePaths;
    return done(canceled || path === undefined ? 'cancelled' : { path });
  },
  toSave: async (suggestedName) => {
    let defaultPath = join(startFolder, suggestedFileName(suggestedName));
    for (;;) {
      const { canceled, filePath } = await dialog.showSaveDialog(window(), {
        title: 'Save scenario',
        defaultPath,
        filters,
        properties: ['createDirectory', 'showOverwriteConfirmation'],
      });
      if (canceled || filePath === '') return done('cancelled');
      if (extname(filePath) === '.json') return done({ path: filePath });
      // The dialog asked about the name as typed, not about the name with its ending: ask again if that one is taken.
      const path = join(dirname(filePath), suggestedFileName(basename(filePath)));
      if (!existsSync(path)) return done({ path });
      defaultPath = path;
    }
  },
  names: async () => done([]),
});
