/**
 */
package gapwright.model;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Connected Winding</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * One winding of a connection, with its sense.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.ConnectedWinding#getWinding <em>Winding</em>}</li>
 *   <li>{@link gapwright.model.ConnectedWinding#isReversed <em>Reversed</em>}</li>
 * </ul>
 *
 * @see gapwright.model.GapwrightPackage#getConnectedWinding()
 * @model
 * @generated
 */
public interface ConnectedWinding extends EObject {
	/**
	 * Returns the value of the '<em><b>Winding</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the value of the '<em>Winding</em>' reference.
	 * @see #setWinding(Winding)
	 * @see gapwright.model.GapwrightPackage#getConnectedWinding_Winding()
	 * @model resolveProxies="false" required="true"
	 * @generated
	 */
	Winding getWinding();

	/**
	 * Sets the value of the '{@link gapwright.model.ConnectedWinding#getWinding <em>Winding</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Winding</em>' reference.
	 * @see #getWinding()
	 * @generated
	 */
	void setWinding(Winding value);

	/**
	 * Returns the value of the '<em><b>Reversed</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the value of the '<em>Reversed</em>' attribute.
	 * @see #setReversed(boolean)
	 * @see gapwright.model.GapwrightPackage#getConnectedWinding_Reversed()
	 * @model
	 * @generated
	 */
	boolean isReversed();

	/**
	 * Sets the value of the '{@link gapwright.model.ConnectedWinding#isReversed <em>Reversed</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Reversed</em>' attribute.
	 * @see #isReversed()
	 * @generated
	 */
	void setReversed(boolean value);

} // ConnectedWinding
