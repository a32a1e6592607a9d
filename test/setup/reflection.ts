/** Decorators leave their metadata through this package; it has to be there before any decorated class. */
import 'reflect-metadata';
