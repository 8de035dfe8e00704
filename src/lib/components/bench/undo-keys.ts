const texts = ['text', 'search', 'email', 'password'];

const isTyping = (target: EventTarget | null) =>
	(target instanceof HTMLInputElement && texts.includes(target.type)) ||
	target instanceof HTMLTextAreaElement;

/** Ctrl or Cmd with Z is undo, with Shift+Z or Y redo; null in a text field, which has its own. */
export function undoKey(event: KeyboardEvent): 'undo' | 'redo' | null {
	if (!(event.ctrlKey || event.metaKey) || event.altKey || isTyping(event.target)) return null;
	const key = event.key.toLowerCase();
	if (key === 'z') return event.shiftKey ? 'redo' : 'undo';
	return key === 'y' ? 'redo' : null;
}
