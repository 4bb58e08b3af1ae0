/** Stands for any font, picture or style sheet that a screen imports. */
export default 1;
