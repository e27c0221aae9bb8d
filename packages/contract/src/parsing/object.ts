import * as z from 'zod';

// zod would probe `new Function` when it makes an object schema, which a strict content security policy reports as a violation.
// Set here, where every object schema of the contract is made, because a module with nothing but an effect would be shaken out.
z.config({ jitless: true });

/** zod's object. Unknown keys are dropped, so that older servers understand newer clients. */
export const object = <Shape extends z.ZodRawShape>(shape: Shape) => z.object(shape);
