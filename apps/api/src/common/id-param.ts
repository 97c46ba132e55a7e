import { Param, ParseUUIDPipe } from '@nestjs/common';
import { Problem } from './problem';

const pipe = new ParseUUIDPipe({ exceptionFactory: () => Problem.notFound('thing') });

/** An id in the path. What is not an id cannot name anything, so it answers 404. */
export const IdParam = (name: string): ParameterDecorator => Param(name, pipe);
