/**
 * The language server protocol: lines and columns in the client's encoding, capabilities, requests
 * and settings. Only this package knows the protocol's types.
 */
package dev.tallystick.lsp;
