/** Why a folder of aeroplane files cannot be used, in one line for the person who starts the service. */
export class CatalogueFault extends Error {
  constructor(folder: string, what: string) {
    super(`catalogue ${oneLine(folder)}: ${oneLine(what)}`);
    this.name = 'CatalogueFault';
  }
}

/** File names and parts of files come from outside: none of them may start a line of its own. */
function oneLine(text: string): string {
  return text.replace(/[\p{Cc}\p{Cs}\p{Zl}\p{Zp}]/gu, '\ufffd');
}
