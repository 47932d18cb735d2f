/**
 * The window: one screen that shows a step and its review and computes nothing itself. Start with
 * {@link lyate.window.WorkbenchFrame}; {@link lyate.window.Workbench} puts the panels together,
 * {@link lyate.window.StepPresenter} asks the reviewer away from the event thread.
 */
package lyate.window;
