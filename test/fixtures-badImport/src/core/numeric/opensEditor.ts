import * as vscode from 'vscode';
export const open = vscode.workspace.openTextDocument;
