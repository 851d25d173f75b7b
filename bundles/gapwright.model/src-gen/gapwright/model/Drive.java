/**
 */
package gapwright.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Drive</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * What a winding is connected to at an operating point.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.Drive#getWinding <em>Winding</em>}</li>
 * </ul>
 *
 * @see gapwright.model.GapwrightPackage#getDrive()
 * @model abstract="true"
 * @generated
 */
public interface Drive extends Element {
	/**
	 * Returns the value of the '<em><b>Winding</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the value of the '<em>Winding</em>' reference.
	 * @see #setWinding(Winding)
	 * @see gapwright.model.GapwrightPackage#getDrive_Winding()
	 * @model resolveProxies="false" required="true"
	 * @generated
	 */
	Winding getWinding();

	/**
	 * Sets the value of the '{@link gapwright.model.Drive#getWinding <em>Winding</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Winding</em>' reference.
	 * @see #getWinding()
	 * @generated
	 */
	void setWinding(Winding value);

} // Drive
