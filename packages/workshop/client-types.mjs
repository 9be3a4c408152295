import openapiTypes, { astToString } from 'openapi-typescript';
import ts from 'typescript';

/** A file in a form or an answer is a Blob to the screens, which the contract calls a binary string. */
const fileAsBlob = (/** @type {{ format?: string }} */ { format }) =>
  format === 'binary' ? ts.factory.createTypeReferenceNode('Blob') : undefined;

/**
 * The typed client's schema as text.
 * @param {Parameters<typeof openapiTypes>[0]} contract the OpenAPI document
 */
export const clientTypes = async (contract) =>
  astToString(await openapiTypes(contract, { transform: fileAsBlob }));
