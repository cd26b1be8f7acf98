import { join } from "node:path";
import { projectFolder } from "./projectFolder.js";

/** The folder with the package file and lock of the editor that tests use where no desktop editor is installed. */
export const editorPackageFolder = () => join(projectFolder(), "test", "editor", "server");

/** Where that package keeps the editor itself once it is installed. */
export const editorServerFolder = () => join(editorPackageFolder(), "node_modules", "code-server", "lib", "vscode");
