/** Saves a text as a file on the person's machine. */
export function saveText(name: string, type: string, text: string): void {
	const address = URL.createObjectURL(new Blob([text], { type: `${type};charset=utf-8` }));
	const link = document.createElement('a');
	link.href = address;
	link.download = name;
	link.click();
	setTimeout(() => URL.revokeObjectURL(address), 1000);
}
